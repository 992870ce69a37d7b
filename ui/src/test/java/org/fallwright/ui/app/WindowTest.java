package org.fallwright.ui.app;

import static org.assertj.core.api.Assertions.assertThat;
import static org.junit.jupiter.api.Assertions.assertTimeoutPreemptively;
import static org.junit.jupiter.api.Assumptions.assumeFalse;

import com.fasterxml.jackson.databind.node.ObjectNode;
import java.awt.Component;
import java.awt.Container;
import java.awt.GraphicsEnvironment;
import java.awt.Robot;
import java.awt.image.BufferedImage;
import java.io.File;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Duration;
import java.util.Arrays;
import java.util.List;
import java.util.concurrent.Callable;
import java.util.concurrent.FutureTask;
import java.util.stream.Stream;
import javax.imageio.ImageIO;
import javax.swing.JLabel;
import javax.swing.SwingUtilities;
import javax.swing.text.JTextComponent;
import org.fallwright.core.plan.Judged;
import org.fallwright.core.site.Site;
import org.fallwright.core.store.SiteFile;
import org.fallwright.ui.demo.DemoSite;
import org.fallwright.ui.setups.Answer;
import org.fallwright.ui.text.Amounts;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** The real window on a display: it opens, plans in the background, and follows a choice. */
class WindowTest {
  /** Set where a display must be there, so that a missing one is no reason to pass. */
  private static final String NEEDED = "FALLWRIGHT_DISPLAY_NEEDED";

  @TempDir Path folder;
  private MainWindow window;

  @BeforeEach
  void display() {
    if (System.getenv(NEEDED) == null) {
      assumeFalse(GraphicsEnvironment.isHeadless(), "there is no display");
    }
  }

  @AfterEach
  void close() throws Exception {
    if (window != null) {
      SwingUtilities.invokeAndWait(window::dispose);
    }
  }

  @Test
  void opensPlansAndFollowsAChoice() throws Exception {
    open(DemoSite.asItIs().lays(90, 3, 7));
    waitFor(() -> window.shown().chosen().isPresent());
    assertThat(onEvents(() -> window.getTitle())).isEqualTo("Oak behind the house - Fallwright");
    BufferedImage first = picture("window-first");
    SwingUtilities.invokeAndWait(() -> window.desk().ways().step(1));
    assertThat(onEvents(() -> window.shown().chosen().orElseThrow())).isSameAs(ranked(2));
    BufferedImage second = picture("window-second");
    assertThat(differing(first, second)).isGreaterThan(2000);
  }

  @Test
  void untickingALinePlansAgainWithoutIt() throws Exception {
    open(DemoSite.asItIs().only("pickup", "V1"));
    waitFor(() -> window.shown().chosen().isPresent());
    assertThat(onEvents(() -> window.shown().chosen().orElseThrow().setup().line()))
        .isEqualTo("L1");
    SwingUtilities.invokeAndWait(() -> window.ticked("L1", false));
    assertThat(onEvents(() -> window.getTitle())).endsWith("(edited)");
    waitFor(() -> window.shown().chosen().isPresent());
    assertThat(onEvents(() -> window.shown().chosen().orElseThrow().setup().line()))
        .isEqualTo("L2");
    SwingUtilities.invokeAndWait(() -> window.saving().save());
    assertThat(SiteFile.read(folder.resolve("oak.fallsite.json")).leftBehind())
        .extracting(l -> l.item())
        .containsExactly("L1");
    assertThat(onEvents(() -> window.getTitle())).doesNotContain("edited");
  }

  @Test
  void theStripFollowsUnitsAndChoice() throws Exception {
    open(DemoSite.asItIs().lays(90, 3, 7));
    waitFor(() -> window.shown().chosen().isPresent());
    List<String> us = strip();
    assertThat(us)
        .containsAll(says(Answer.of(ranked(1), new Amounts(Site.Display.US))))
        .contains("Workable", "1,450 lbf", "1,070 lbf as entered", "1.44 times the need")
        .contains("gust 8.9 mph");
    SwingUtilities.invokeAndWait(window::otherUnits);
    waitFor(() -> window.shown().site().orElseThrow().display() == Site.Display.METRIC);
    List<String> metric = strip();
    assertThat(metric)
        .containsAll(says(Answer.of(ranked(1), new Amounts(Site.Display.METRIC))))
        .contains("Workable", "6.44 kN", "4.73 kN as entered", "1.44 times the need")
        .contains("gust 4.0 m/s")
        .anyMatch(t -> t.startsWith("Hand-winch at A3 over A1, lay 000°. Plan for 6.44 kN"))
        .noneMatch(t -> t.endsWith(" lbf"));
    SwingUtilities.invokeAndWait(() -> window.desk().ways().step(2));
    Judged third = onEvents(() -> window.shown().chosen().orElseThrow());
    assertThat(third).isSameAs(ranked(3));
    assertThat(strip())
        .containsAll(says(Answer.of(third, new Amounts(Site.Display.METRIC))))
        .contains("6.23 kN", "8.18 kN", "1.31 times the need", "Shed")
        .anyMatch(t -> t.startsWith("Pickup (awd) at V1, lay 003°. Plan for 6.23 kN"))
        .doesNotContain("6.44 kN", "1.44 times the need");
    picture("window-metric-third");
    SwingUtilities.invokeAndWait(window::otherLook);
    picture("window-dark-metric");
  }

  @Test
  void aSiteFileThatCannotBePlannedLeavesItsSentence() throws Exception {
    open(DemoSite.asItIs().with(s -> ((ObjectNode) s.get("tree")).put("species", "mystery")));
    waitFor(() -> window.shown().failure().isPresent());
    assertThat(onEvents(() -> window.shown().failure()).orElseThrow())
        .startsWith("species is \"mystery\"");
    assertThat(strip()).anyMatch(t -> t.startsWith("species is \"mystery\""));
  }

  /** Opens a site file in the window as it is put together for use. */
  private void open(DemoSite demo) throws Exception {
    Path file = Files.write(folder.resolve("oak.fallsite.json"), demo.bytes());
    Wiring wiring =
        new Wiring(
            new CorePlanning(DemoSite.sources()),
            SiteFile::read,
            StoredPictures.in(Path.of("..", "maps-cache", "basemaps")),
            null);
    SwingUtilities.invokeAndWait(
        () -> {
          Look.DAY.use();
          window = new MainWindow(wiring, Look.DAY);
          window.setSize(1400, 880);
          window.setLocation(0, 0);
          window.setVisible(true);
          window.open(file);
        });
  }

  private Judged ranked(int rank) throws Exception {
    return onEvents(() -> window.shown().plan().orElseThrow().ranked().get(rank - 1));
  }

  /** Every text of the answer strip. */
  private List<String> strip() throws Exception {
    return onEvents(() -> texts(window.desk().regions().get(0)).toList());
  }

  private static Stream<String> texts(Component c) {
    if (c instanceof JLabel l) {
      return Stream.ofNullable(l.getText());
    }
    if (c instanceof JTextComponent t) {
      return Stream.of(t.getText());
    }
    return c instanceof Container box
        ? Arrays.stream(box.getComponents()).flatMap(WindowTest::texts)
        : Stream.of();
  }

  private static List<String> says(Answer a) {
    return Stream.concat(
            Stream.of(a.sentence()),
            a.cells().stream().flatMap(c -> Stream.of(c.value(), c.note())))
        .toList();
  }

  private static void waitFor(Callable<Boolean> condition) {
    assertTimeoutPreemptively(
        Duration.ofSeconds(60),
        () -> {
          while (!onEvents(condition)) {
            Thread.sleep(50);
          }
        });
  }

  private static <T> T onEvents(Callable<T> asked) throws Exception {
    FutureTask<T> task = new FutureTask<>(asked);
    SwingUtilities.invokeAndWait(task);
    return task.get();
  }

  private BufferedImage picture(String name) throws Exception {
    Robot robot = new Robot();
    robot.waitForIdle();
    robot.delay(1500);
    BufferedImage image = robot.createScreenCapture(onEvents(() -> window.getBounds()));
    ImageIO.write(image, "png", new File("target/" + name + ".png"));
    return image;
  }

  private static int differing(BufferedImage a, BufferedImage b) {
    int n = 0;
    for (int y = 0; y < a.getHeight(); y++) {
      for (int x = 0; x < a.getWidth(); x++) {
        n += a.getRGB(x, y) != b.getRGB(x, y) ? 1 : 0;
      }
    }
    return n;
  }
}
