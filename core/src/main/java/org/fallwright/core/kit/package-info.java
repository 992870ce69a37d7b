/**
 * A firm's kit, shared by its sites: what it owns, on which truck and shelf it is, and who is in
 * the crew.
 *
 * <p>Read {@link org.fallwright.core.kit.Kit} first. A site keeps its own copy of the gear, so a
 * site file stays whole by itself; {@link org.fallwright.core.kit.Copied} makes that copy, {@link
 * org.fallwright.core.kit.Differences} says where the two no longer agree, and {@link
 * org.fallwright.core.kit.LoadOut} lists what a setup needs, by truck and shelf. Everything is SI.
 * It must not depend on files, plugins or windows.
 */
package org.fallwright.core.kit;
