/**
 * The words on screen: one bundle, keyed by what a text means, and the amounts in the units that
 * the person reads.
 *
 * <p>Read {@link org.fallwright.ui.text.Messages} first. Values come in SI; only here do they
 * become text. Must not depend on any other package of the desktop.
 */
package org.fallwright.ui.text;
