/**
 * Figures from outside and how they are recorded; for the tests of every module. Read {@link
 * org.fallwright.core.outside.CheckValue}. Values in the unit that each names.
 */
package org.fallwright.core.outside;
