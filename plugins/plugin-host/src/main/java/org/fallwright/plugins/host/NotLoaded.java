package org.fallwright.plugins.host;

/**
 * Something that is not in use, and why.
 *
 * @param name the archive's file name, or the folder
 * @param reason one plain sentence
 */
public record NotLoaded(String name, String reason) {}
