/**
 * What a plugin that pulls the line must offer: a class that implements {@link
 * org.fallwright.plugins.api.PullSourceExtension} and is marked {@link org.pf4j.Extension}, with a
 * public constructor that takes nothing.
 *
 * <p>Read first: {@link org.fallwright.core.pull.PullSource}, then {@link
 * org.fallwright.plugins.api.ParameterReader}. Units are SI throughout: N, m, kg, rad; a parameter
 * whose unit differs says so in its key. The package depends on the core and on PF4J, and knows
 * neither the plugins nor what loads them. A plugin's archive brings neither of the two, nor
 * Jackson: the program provides them.
 */
package org.fallwright.plugins.api;
