package org.fallwright.ui.demo;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.regex.Pattern;
import java.util.stream.Stream;
import org.fallwright.core.plan.Setup;
import org.fallwright.core.worksheet.Compared;
import org.fallwright.core.worksheet.Line;
import org.fallwright.core.worksheet.MarkdownSheet;
import org.fallwright.core.worksheet.Worksheet;
import org.fallwright.core.worksheet.Worksheets;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;

/** The worksheets of the demo site's setups, worked again from the printed text alone. */
class WorksheetDemoTest {
  private static final Pattern SIGN = Pattern.compile("\\p{L}[\\p{L}\\p{N}_]*");
  private static final List<String> WORDS =
      List.of("sin", "cos", "tan", "asin", "atan", "ln", "exp", "min", "max", "abs", "π");

  static Stream<Arguments> setups() {
    return Stream.of("us", "metric")
        .flatMap(
            units ->
                Stream.of(
                    Arguments.of(units, "hand winch over A1", DemoRowsTest.ROW_6),
                    Arguments.of(units, "pick-up on the driveway", DemoRowsTest.ROW_4),
                    Arguments.of(
                        units, "three parts", DemoSite.tackle(3, "3", "pickup", "rwd", "V1")),
                    Arguments.of(
                        units, "read load cell", DemoSite.tackle(3, "4", "pickup", "rwd", "V1")),
                    Arguments.of(
                        units,
                        "wet birch",
                        DemoSite.redirected(342, "hand-winch", "pull", "A3", "A2")),
                    Arguments.of(units, "stump", DemoSite.direct(39, "hand-winch", "pull", "S1")),
                    Arguments.of(units, "crew", DemoSite.direct(0, "crew", "pull", "HC")),
                    Arguments.of(
                        units, "wrong way", DemoSite.direct(188, "hand-winch", "pull", "A1"))));
  }

  private static Worksheet sheet(String units, Setup setup) {
    return Worksheets.of(
        DemoSite.asItIs().with(s -> s.put("display", units)).site(), setup, DemoSite.sources());
  }

  @ParameterizedTest(name = "{0}: {1}")
  @MethodSource("setups")
  void thePrintedNumbersGiveThePrintedResults(String units, String name, Setup setup) {
    List<PrintedWorksheet.Row> rows =
        PrintedWorksheet.rows(MarkdownSheet.write(sheet(units, setup)));
    assertThat(rows.stream().filter(PrintedWorksheet.Row::worked)).hasSizeGreaterThan(30);
    assertThat(rows)
        .filteredOn(PrintedWorksheet.Row::worked)
        .allSatisfy(
            r ->
                assertThat(r.offInLastDigit())
                    .as("%s = %s = %s gives %s", r.symbol(), r.numbers(), r.result(), r.again())
                    .isLessThanOrEqualTo(0.5 + 1e-6));
  }

  @ParameterizedTest(name = "{0}: {1}")
  @MethodSource("setups")
  void everySignOfASumIsALineAboveWithThatNumber(String units, String name, Setup setup) {
    Map<String, String> above = new HashMap<>();
    for (PrintedWorksheet.Row r : PrintedWorksheet.rows(MarkdownSheet.write(sheet(units, setup)))) {
      if (r.worked()) {
        String numbers =
            SIGN.matcher(r.formula())
                .replaceAll(
                    m -> {
                      String sign = m.group();
                      String n =
                          WORDS.contains(sign)
                              ? sign
                              : above.containsKey(sign) ? above.get(sign) : end(sign, r);
                      return n.startsWith("−") ? "(" + n + ")" : n;
                    });
        assertThat(numbers).as(r.symbol()).isEqualTo(r.numbers());
      }
      assertThat(above.put(r.symbol(), r.result())).as("%s twice", r.symbol()).isNull();
    }
  }

  /** The result at an input's bad end stands in the name of its line, before the unit. */
  private static String end(String sign, PrintedWorksheet.Row r) {
    assertThat(r.symbol()).isEqualTo("d_" + sign);
    return r.name().replaceFirst(".* it is (−?[0-9.]+).*", "$1");
  }

  @ParameterizedTest(name = "{0}: {1}")
  @MethodSource("setups")
  void roundingBringsLessThanAThousandth(String units, String name, Setup setup) {
    Worksheet w = sheet(units, setup);
    assertThat(w.compared()).hasSizeGreaterThan(8);
    assertThat(w.compared())
        .allSatisfy(c -> assertThat(c.difference()).as(c.toString()).isLessThan(1e-3));
    if (name.equals("wrong way")) {
      return;
    }
    assertThat(w.compared().stream().map(Compared::symbol))
        .contains("T_need", "T_plan", "T_hold", "s_h", "T_up", "T_in", "x_s95", "C", "margin");
  }

  @ParameterizedTest(name = "{0}: {1}")
  @MethodSource("setups")
  void aSumStandsOnItsOwn(String units, String name, Setup setup) {
    Worksheet w = sheet(units, setup);
    for (Line l : w.lines().filter(Line::worked).toList()) {
      List<Line> few = w.sum(l).lines().toList();
      assertThat(few.get(few.size() - 1)).isEqualTo(l);
      List<String> there = few.stream().map(Line::symbol).toList();
      assertThat(few).allSatisfy(x -> assertThat(there).containsAll(x.dependsOn()));
    }
  }
}
