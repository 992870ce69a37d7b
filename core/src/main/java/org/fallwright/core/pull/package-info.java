/**
 * What a pull source must say of itself and answer: the contract on which plugins are built, and
 * its version. Core, plugins and host share these types and nothing else.
 *
 * <p>Read first: {@link org.fallwright.core.pull.PullSource}, then {@link
 * org.fallwright.core.pull.SourceDescription} with {@link org.fallwright.core.pull.Parameter}, then
 * {@link org.fallwright.core.pull.PullRequest} and {@link org.fallwright.core.pull.PullOffer}.
 * Forces in N at the source's own line end, lengths in m, angles in rad; a rise is positive where
 * the line rises towards the tree, a slope where the ground rises away from it. A low errs towards
 * too little, a high towards too much. The package must not depend on the site, the plan or any one
 * source. Whatever changes in it changes {@link org.fallwright.core.pull.PullSource#CONTRACT}.
 */
package org.fallwright.core.pull;
