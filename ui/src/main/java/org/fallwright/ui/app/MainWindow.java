package org.fallwright.ui.app;

import java.awt.Dimension;
import java.awt.GraphicsEnvironment;
import java.awt.Rectangle;
import java.awt.event.WindowAdapter;
import java.awt.event.WindowEvent;
import java.io.IOException;
import java.nio.file.Path;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.function.BooleanSupplier;
import java.util.function.DoubleConsumer;
import javax.swing.JFileChooser;
import javax.swing.JFrame;
import javax.swing.JOptionPane;
import javax.swing.SwingUtilities;
import org.fallwright.core.kit.Kit;
import org.fallwright.core.plan.Plan;
import org.fallwright.core.site.LeftBehind;
import org.fallwright.core.site.Site;
import org.fallwright.core.store.KitFile;
import org.fallwright.ui.document.OpenSite;
import org.fallwright.ui.home.SiteMaps;
import org.fallwright.ui.task.NewestWins;
import org.fallwright.ui.text.Messages;
import org.slf4j.Logger;
import org.slf4j.LoggerFactory;

/** The main window. To be used on the event thread, as all of the toolkit. */
public final class MainWindow extends JFrame {
  private static final Logger LOG = LoggerFactory.getLogger(MainWindow.class);

  private final Wiring wiring;
  private final OpenSite open = new OpenSite();
  private final ExecutorService worker =
      Executors.newFixedThreadPool(
          2,
          r -> {
            Thread t = new Thread(r, "planning");
            t.setDaemon(true);
            return t;
          });
  private final NewestWins reading = new NewestWins(worker, SwingUtilities::invokeLater);
  private final NewestWins planning = new NewestWins(worker, SwingUtilities::invokeLater);
  private final NewestWins doubting = new NewestWins(worker, SwingUtilities::invokeLater);
  private final Desk desk;
  private final Saving saving;

  public MainWindow(Wiring wiring, Look look) {
    super(Messages.text("window.title"));
    this.wiring = wiring;
    StatusBar status = new StatusBar(this::stop, this::cautions);
    StartCard start = new StartCard(this::choose, wiring.demo() == null ? null : this::openDemo);
    desk = new Desk(open, look, status, start);
    desk.onTicked(this::ticked);
    saving = new Saving(this, open, wiring.sites(), wiring.demo(), this::title);
    setContentPane(desk);
    setJMenuBar(new Menus(this, wiring.demo() != null));
    setDefaultCloseOperation(DO_NOTHING_ON_CLOSE);
    addWindowListener(
        new WindowAdapter() {
          @Override
          public void windowClosing(WindowEvent e) {
            quit();
          }

          @Override
          public void windowClosed(WindowEvent e) {
            planning.cancel();
            reading.cancel();
            doubting.cancel();
            worker.shutdownNow();
            desk.plan().close();
          }
        });
    setMinimumSize(new Dimension(1024, 640));
    Rectangle screen = GraphicsEnvironment.getLocalGraphicsEnvironment().getMaximumWindowBounds();
    setSize(Math.min(1500, screen.width), Math.min(950, screen.height));
    setLocationRelativeTo(null);
  }

  /** The site and plan shown. */
  public OpenSite shown() {
    return open;
  }

  /** Reads a site file in the background, shows it and plans it. */
  public void open(Path file) {
    reading.start(
        (progress, cancelled) -> {
          Site site = wiring.sites().read(file);
          SiteMaps.Opened pictures = wiring.pictures().open(site, file);
          return new Read(site, pictures, kit(site, file));
        },
        new Telling<Read>() {
          @Override
          public void done(Read read) {
            show(read, file);
          }

          @Override
          public void failed(Exception cause) {
            LOG.warn("Site file not opened", cause);
            JOptionPane.showMessageDialog(
                MainWindow.this,
                sentence(cause),
                Messages.text("open.failed"),
                JOptionPane.WARNING_MESSAGE);
          }
        });
  }

  /** Plans the open site again. */
  public void plan() {
    open.site().map(s -> s.in(open.display())).ifPresent(this::plan);
  }

  void choose() {
    JFileChooser chooser =
        new JFileChooser(
            open.file().map(p -> p.toAbsolutePath().getParent().toFile()).orElse(null));
    chooser.setDialogTitle(Messages.text("open.title"));
    if (chooser.showOpenDialog(this) == JFileChooser.APPROVE_OPTION) {
      saving.before(() -> open(chooser.getSelectedFile().toPath()));
    }
  }

  void openDemo() {
    saving.before(() -> open(wiring.demo()));
  }

  Saving saving() {
    return saving;
  }

  /** Closes the window, after edits have been saved or given up. */
  void quit() {
    saving.before(this::dispose);
  }

  void otherUnits() {
    Site.Display other = open.display() == Site.Display.US ? Site.Display.METRIC : Site.Display.US;
    open.show(other);
    if (open.plan().isEmpty()) {
      plan();
      return;
    }
    Site site = open.site().orElseThrow().in(other);
    Plan plan = open.plan().get();
    planning.start(
        (progress, cancelled) -> wiring.planning().again(site, plan),
        new Telling<Plan>() {
          @Override
          public void done(Plan again) {
            open.reworded(site, again);
          }

          @Override
          public void failed(Exception cause) {
            LOG.error("Not said again in other units", cause);
            open.notPlanned(sentence(cause));
          }
        });
  }

  /** Works out how far the chosen way can be trusted, in a window of its own. */
  void doubt() {
    if (open.chosen().isEmpty()) {
      JOptionPane.showMessageDialog(this, Messages.text("doubt.nothing"));
      return;
    }
    Site site = open.site().orElseThrow().in(open.display());
    new DoubtWindow(this, wiring.planning(), doubting, site, open.chosen().get()).setVisible(true);
  }

  void otherLook() {
    Look other = desk.look().other();
    other.use();
    desk.look(other);
  }

  void stop() {
    planning.cancel();
    open.notPlanned(null);
  }

  void cautions() {
    Words.show(this, "caution.title", "caution.text");
  }

  void about() {
    Words.show(this, "about.title", "about.text");
  }

  Desk desk() {
    return desk;
  }

  private record Read(Site site, SiteMaps.Opened pictures, Kit kit) {}

  /** The kit beside the site; null where it is not there or cannot be read. */
  private static Kit kit(Site site, Path file) {
    try {
      return KitFile.beside(site, file).orElse(null);
    } catch (IOException e) {
      LOG.warn("Kit file not read", e);
      return null;
    }
  }

  private void show(Read read, Path file) {
    open.open(file, read.site());
    desk.open(read.site(), read.pictures(), read.kit());
    title();
    plan(read.site());
  }

  private void title() {
    String name = Messages.text("window.title.site", open.site().orElseThrow().name());
    setTitle(open.changed() ? Messages.text("window.title.changed", name) : name);
  }

  /** A thing of the gear comes to the site, or stays: everything is judged again. */
  void ticked(String item, boolean atHand) {
    Site site = open.site().orElseThrow();
    open.edited(
        atHand ? site.taking(item) : site.leaving(new LeftBehind(item, desk.whereIs(item))));
    title();
    plan();
  }

  private void plan(Site site) {
    open.planning(0);
    planning.start(
        (DoubleConsumer progress, BooleanSupplier cancelled) ->
            wiring.planning().plan(site, progress, cancelled),
        new Telling<Plan>() {
          @Override
          public void progress(double share) {
            open.planning(share);
          }

          @Override
          public void done(Plan plan) {
            open.planned(plan);
          }

          @Override
          public void failed(Exception cause) {
            LOG.error("Planning failed", cause);
            open.notPlanned(sentence(cause));
          }
        });
  }

  static String sentence(Exception cause) {
    return cause.getMessage() == null || cause.getMessage().isBlank()
        ? Messages.text("failure.unnamed", cause.getClass().getSimpleName())
        : cause.getMessage();
  }

  private abstract static class Telling<T> implements NewestWins.Outcome<T> {
    @Override
    public void progress(double share) {
      // reading a file is too short to show
    }
  }
}
