package org.fallwright.ui.sheet;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import org.apache.pdfbox.Loader;
import org.apache.pdfbox.pdmodel.PDDocument;
import org.apache.pdfbox.text.PDFTextStripper;
import org.fallwright.core.advice.NotByPulling;
import org.fallwright.ui.demo.OneCrew;
import org.fallwright.ui.map.GroundPainter;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;

class MethodOnSheetTest {
  @ParameterizedTest
  @EnumSource(Paper.class)
  void whereAllFailsTheSheetSaysSoInFullAndStillOnOnePage(Paper paper) throws IOException {
    SheetFile sheet =
        new SheetFile(paper, OneCrew.SITE, OneCrew.PLAN, 1, GroundPainter.NONE, null, "0.1.0");
    Files.write(Path.of("target", "sheet-method-" + paper + ".png"), sheet.png());
    try (PDDocument doc = Loader.loadPDF(sheet.pdf())) {
      assertThat(doc.getNumberOfPages()).isEqualTo(1);
      assertThat(new PDFTextStripper().getText(doc).replaceAll("\\s+", " "))
          .contains(NotByPulling.of(OneCrew.PLAN).orElseThrow().sentence())
          .contains("This setup: " + OneCrew.PLAN.ranked().get(0).sentence());
    }
  }
}
