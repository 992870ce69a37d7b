/**
 * The site file and the kit file: how a {@link org.fallwright.core.site.Site} and a {@link
 * org.fallwright.core.kit.Kit} are kept on disk, and what is said when a file cannot be trusted.
 *
 * <p>Read {@link org.fallwright.core.store.SiteFile} first; the form itself is written down in
 * {@code core/site-file.md} and in {@code fallsite-2.schema.json} beside this package, that of the
 * kit in {@code core/kit-file.md} and {@code fallkit-1.schema.json}. Names in the file end in their
 * unit, as the components of the site's records do; nothing is converted here.
 *
 * <p>A file is taken whole or refused: no value is defaulted, clipped, rounded or coerced. Ranges
 * belong to the records of the site, not to this package. It must not depend on plugins, on maps or
 * on anything that draws.
 */
package org.fallwright.core.store;
