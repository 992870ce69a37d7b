package org.fallwright.ui.app;

import static org.assertj.core.api.Assertions.assertThat;
import static org.junit.jupiter.api.Assertions.assertTimeoutPreemptively;
import static org.junit.jupiter.api.Assumptions.assumeFalse;

import java.awt.GraphicsEnvironment;
import java.awt.Robot;
import java.awt.image.BufferedImage;
import java.io.File;
import java.nio.file.Path;
import java.time.Duration;
import java.util.concurrent.Callable;
import java.util.concurrent.FutureTask;
import javax.imageio.ImageIO;
import javax.swing.SwingUtilities;
import org.fallwright.core.plan.Plan;
import org.fallwright.core.site.Site;
import org.fallwright.ui.DemoLike;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;

/** The real window on a display: it opens, plans in the background, and follows a choice. */
class WindowTest {
  /** Set where a display must be there, so that a missing one is no reason to pass. */
  private static final String NEEDED = "FALLWRIGHT_DISPLAY_NEEDED";

  private final Site site = DemoLike.site(Site.Display.US);
  private final Plan plan = DemoLike.plan(site);
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
    Wiring wiring = new Wiring((s, progress, stop) -> plan, file -> site, (s, file) -> null, null);
    SwingUtilities.invokeAndWait(
        () -> {
          Look.DAY.use();
          window = new MainWindow(wiring, Look.DAY);
          window.setSize(1400, 880);
          window.setLocation(0, 0);
          window.setVisible(true);
          window.open(Path.of("oak.fallsite.json"));
        });
    waitFor(() -> window.shown().chosen().isPresent());
    assertThat(onEvents(() -> window.getTitle())).isEqualTo("Oak behind the house - Fallwright");
    BufferedImage first = picture("window-first");
    SwingUtilities.invokeAndWait(() -> window.desk().ways().step(1));
    assertThat(onEvents(() -> window.shown().chosen().orElseThrow()))
        .isSameAs(plan.ranked().get(1));
    BufferedImage second = picture("window-second");
    assertThat(differing(first, second)).isGreaterThan(2000);
    SwingUtilities.invokeAndWait(window::otherUnits);
    waitFor(() -> window.shown().site().orElseThrow().display() == Site.Display.METRIC);
    SwingUtilities.invokeAndWait(window::otherLook);
    picture("window-dark-metric");
  }

  @Test
  void aSiteFileThatCannotBePlannedLeavesItsSentence() throws Exception {
    Wiring wiring =
        new Wiring(
            (s, progress, stop) -> {
              throw new IllegalArgumentException("The site offers no line.");
            },
            file -> site,
            (s, file) -> null,
            null);
    SwingUtilities.invokeAndWait(
        () -> {
          Look.DAY.use();
          window = new MainWindow(wiring, Look.DAY);
          window.setVisible(true);
          window.open(Path.of("oak.fallsite.json"));
        });
    waitFor(() -> window.shown().failure().isPresent());
    assertThat(onEvents(() -> window.shown().failure())).contains("The site offers no line.");
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
