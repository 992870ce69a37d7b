package org.fallwright.ui.text;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.ResourceBundle;
import java.util.Set;
import java.util.TreeSet;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.Stream;
import org.fallwright.core.site.How;
import org.fallwright.core.site.Looked;
import org.junit.jupiter.api.Test;

class MessagesTest {
  @Test
  void everyKeyNamedInTheProgramHasAText() throws IOException {
    Set<String> named = new TreeSet<>();
    Pattern call = Pattern.compile("\"([a-z]+(?:\\.[a-z-]+)+)\"");
    for (Path p : sources()) {
      Matcher m = call.matcher(Files.readString(p));
      while (m.find()) {
        named.add(m.group(1));
      }
    }
    Set<String> groups = new TreeSet<>();
    ResourceBundle.getBundle("org.fallwright.ui.text.desktop")
        .keySet()
        .forEach(k -> groups.add(k.substring(0, k.indexOf('.'))));
    named.removeIf(
        k ->
            !groups.contains(k.substring(0, k.indexOf('.')))
                || k.matches(".*\\.(json|properties|mbtiles)"));
    assertThat(named).hasSizeGreaterThan(60).allMatch(Messages::has);
  }

  @Test
  void everyConstantHasAWord() {
    for (How h : How.values()) {
      assertThat(Messages.of("how", h)).isNotBlank();
    }
    for (Looked.What w : Looked.What.values()) {
      assertThat(Messages.of("looked", w)).isNotBlank();
    }
    for (Looked.Found f : Looked.Found.values()) {
      assertThat(Messages.of("found", f)).isNotBlank();
    }
  }

  @Test
  void placesAreFilledAndApostrophesSurvive() {
    assertThat(Messages.text("plan.lay", "003°", "17.5 m")).isEqualTo("Lay 003°, tip 17.5 m out");
    assertThat(Messages.text("caution.line")).contains("the tree's own roots");
  }

  @Test
  void theProgramNeverCallsAnythingSafe() {
    ResourceBundle b = ResourceBundle.getBundle("org.fallwright.ui.text.desktop");
    assertThat(b.keySet()).noneMatch(k -> b.getString(k).toLowerCase().matches(".*\\bsafe\\b.*"));
  }

  private static List<Path> sources() throws IOException {
    try (Stream<Path> s = Files.walk(Path.of("src", "main", "java"))) {
      return s.filter(p -> p.toString().endsWith(".java")).toList();
    }
  }
}
