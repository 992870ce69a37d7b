/**
 * The drawn ground of the demonstration site: an aerial picture that no one has to ask for, because
 * no camera took it.
 *
 * <p>{@link org.fallwright.maps.demo.DemoGround} puts it together and writes it as a tile set; the
 * other classes each colour one thing: what grows, what is driven on, what is roofed, what has a
 * crown, what is fenced. Each answers for one point of the site plane [m east, m north] at a time,
 * so the same ground comes out at every zoom. Colours are shares of full light, 0 to 1.
 *
 * <p>Coordinates are those of the demonstration site; what lies beyond them (woods, fields, the
 * road's verge) is invented to fill the picture. Must not depend on anything but the frame and the
 * tile writer: no calculation may ever use this picture.
 */
package org.fallwright.maps.demo;
