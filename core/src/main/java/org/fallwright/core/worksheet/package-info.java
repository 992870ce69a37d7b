/**
 * The worksheet: every figure of a setup as a chain of lines that a person with a calculator can
 * follow. Start with {@link org.fallwright.core.worksheet.Worksheets}; a {@link
 * org.fallwright.core.worksheet.Line} is one sum, and {@link
 * org.fallwright.core.worksheet.Workings} works it from the rounded figures that are printed, so
 * that the printed numbers always give the printed result. What the rounding brings against the
 * program's own figures stands at the end of each worksheet.
 *
 * <p>Quantities are in the units that the site is shown in, angles in degrees. Forces are at the
 * tree, in the leg that leaves the attachment. Must not depend on windows, plugins or map files.
 */
package org.fallwright.core.worksheet;
