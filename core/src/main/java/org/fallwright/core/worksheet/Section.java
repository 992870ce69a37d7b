package org.fallwright.core.worksheet;

import java.util.List;

/**
 * A part of a worksheet.
 *
 * @param title its heading
 * @param notes what must be known to follow it, a sentence each
 * @param lines its lines, each using only lines above it
 */
public record Section(String title, List<String> notes, List<Line> lines) {
  public Section {
    notes = List.copyOf(notes);
    lines = List.copyOf(lines);
  }
}
