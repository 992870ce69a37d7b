package org.fallwright.ui.cli;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.PrintWriter;
import java.io.StringWriter;
import java.util.regex.Pattern;
import org.fallwright.ui.home.Home;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

class MeasureCommandTest {
  private final StringWriter out = new StringWriter();
  private final StringWriter err = new StringWriter();

  private String said(String call) {
    int status = run(call);
    assertThat(err.toString()).isEmpty();
    assertThat(status).isZero();
    return out.toString();
  }

  private int run(String call) {
    return Fallwright.run(
        Home.found(),
        site -> {},
        ("measure " + call).split(" "),
        new PrintWriter(out),
        new PrintWriter(err));
  }

  @ParameterizedTest
  @ValueSource(strings = {"girth 1.63", "girth 163cm", "girth 64.173in"})
  void aGirthGivesTheDiameterInBothUnitsWithItsFormula(String call) {
    assertThat(said(call))
        .containsPattern("diameter +51\\.9 cm \\(20\\.4 in\\)")
        .containsPattern("formula +diameter = girth / π, girth 163\\.0 cm \\(64\\.2 in\\)");
  }

  @Test
  void aHeightIsReadOnTheScaleThatIsSaid() {
    assertThat(said("height --distance 25 --top 32.5 --base -3.7 --scale degrees"))
        .containsPattern("height read +17\\.5 m \\(57 ft 7 in\\)")
        .contains("tan top 0.637, tan base -0.065")
        .containsPattern("eye +1\\.62 m")
        .contains("read too high");
    out.getBuffer().setLength(0);
    assertThat(said("height --distance 82ft --top 63.7 --base -6.5 --scale percent"))
        .containsPattern("height read +17\\.5 m");
  }

  /** 25 m off, top read at 15.9 m over the eye; worked by hand from the two triangles. */
  @ParameterizedTest
  @CsvSource({
    "--towards-viewer, towards the viewer it is 16.4 m, read too high by 1.10 m",
    "--away, away from the viewer it is 18.8 m, read too low by 1.26 m",
    "--square, square to the view it is 17.6 m, read too low by 0.04 m"
  })
  void aLeanIsTakenOffOrPutOn(String side, String high, String by) {
    String text =
        said("height --distance 25 --top 32.5 --base -3.7 --scale degrees --lean 6 " + side);
    assertThat(text).contains("leaning 6.0° (10.5 %) ").contains(high).contains(by);
    assertThat(text.lines().filter(l -> l.contains("it was read"))).hasSize(1);
  }

  @Test
  void aLeanWithoutASideShowsAllThree() {
    String text = said("height --distance 25 --top 32.5 --base -3.7 --scale degrees --lean 6");
    assertThat(text.lines().filter(l -> l.contains("it was read"))).hasSize(3);
  }

  @ParameterizedTest
  @CsvSource({
    "lean --offset 0.63 --at 6.0, 6.0° (10.5 %)",
    "lean --stem 6 --scale degrees, 6.0° (10.5 %)",
    "lean --stem 6 --scale percent, 3.4° (6.0 %)",
    "lean --stem 84 --scale degrees --from-level, 6.0° (10.5 %)",
    "lean --view 188:4.2 --view 98:1.0 --scale degrees, 4.3° (7.5 %) towards 264.6°"
  })
  void aLeanComesInDegreesAndPerCent(String call, String lean) {
    assertThat(said(call)).containsPattern("lean +" + Pattern.quote(lean));
    assertThat(out.toString()).containsPattern("\nformula +");
  }

  @ParameterizedTest
  @CsvSource({
    "girth 20, girth_m is 20 m",
    "girth wide, girth is \"wide\"",
    "height --distance 25 --top 3 --base 7 --scale degrees, it must be above base",
    "height --distance 25 --top 30 --base -3 --scale degrees --away, --lean is missing",
    "height --distance 25 --top 30 --base -3 --scale degrees --lean 60, lean_deg is 60 degrees",
    "height --distance 25 --top 30 --base -3 --scale degrees --lean 6 --away --square, not several",
    "lean --offset 0.63, go together",
    "lean, One way of measuring",
    "lean --stem 6 --offset 0.3 --at 3, One way of measuring",
    "lean --stem 6, --scale is missing",
    "lean --stem 84 --scale degrees, goes with --from-level",
    "lean --stem 6 --scale degrees --from-level, goes without --from-level",
    "lean --view 188:4.2 --scale degrees, must be given twice",
    "lean --view 188:4.2 --view 98 --scale degrees, such as 188:4.2",
    "lean --view 188:4.2 --view 200:1 --scale degrees, from 60 to 120 degrees apart"
  })
  void badInputIsOneSentence(String call, String why) {
    assertThat(run(call)).isEqualTo(2);
    assertThat(out.toString()).isEmpty();
    assertThat(err.toString().lines().toList())
        .singleElement()
        .asString()
        .contains(why)
        .endsWith(".");
  }

  @ParameterizedTest
  @ValueSource(
      strings = {
        "height --distance 25 --top 32.5 --base -3.7",
        "height --distance 25 --top 32.5 --base -3.7 --scale grads",
        ""
      })
  void whatIsMissingIsAskedFor(String call) {
    assertThat(run(call)).isEqualTo(2);
    assertThat(out.toString()).isEmpty();
    assertThat(err.toString()).contains("--help").doesNotContain("Exception");
  }

  @ParameterizedTest
  @ValueSource(strings = {"--help", "girth --help", "height --help", "lean --help"})
  void everyMeasureHasHelp(String call) {
    assertThat(said(call)).contains("Usage: fallwright measure");
  }
}
