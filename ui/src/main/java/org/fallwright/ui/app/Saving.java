package org.fallwright.ui.app;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Optional;
import javax.swing.JFileChooser;
import javax.swing.JFrame;
import javax.swing.JOptionPane;
import org.fallwright.core.store.SiteFile;
import org.fallwright.ui.document.OpenSite;
import org.fallwright.ui.text.Messages;

/** Writes the open site, and asks about edits before they would be lost. */
final class Saving {
  private final JFrame window;
  private final OpenSite open;
  private final Wiring.Sites sites;
  private final Path demo;
  private final Runnable saved;

  /**
   * @param demo the demonstration, which is kept as it is; null: none
   * @param saved told after the site was written
   */
  Saving(JFrame window, OpenSite open, Wiring.Sites sites, Path demo, Runnable saved) {
    this.window = window;
    this.open = open;
    this.sites = sites;
    this.demo = demo;
    this.saved = saved;
  }

  /** Does something that leaves the open site, after its edits were saved or given up. */
  void before(Runnable leaving) {
    if (!open.changed()) {
      leaving.run();
      return;
    }
    Object[] answers = {
      Messages.text("save.yes"), Messages.text("save.no"), Messages.text("save.cancel")
    };
    int answer =
        JOptionPane.showOptionDialog(
            window,
            Messages.text("save.ask", open.site().orElseThrow().name()),
            Messages.text("save.title"),
            JOptionPane.DEFAULT_OPTION,
            JOptionPane.QUESTION_MESSAGE,
            null,
            answers,
            answers[0]);
    if (answer == 1 || answer == 0 && save()) {
      leaving.run();
    }
  }

  /** Writes the site to its file; true if it is there. */
  boolean save() {
    Optional<Path> file = open.file().filter(f -> !f.equals(demo));
    return file.isPresent() ? write(file.get()) : saveAs();
  }

  /** Writes the site to a file that is asked for; true if it is there. */
  boolean saveAs() {
    if (open.site().isEmpty()) {
      return false;
    }
    JFileChooser chooser = new JFileChooser();
    chooser.setDialogTitle(Messages.text("save.title"));
    chooser.setSelectedFile(
        open.file()
            .map(f -> f.getFileName().toFile())
            .orElse(new java.io.File("site" + SiteFile.EXTENSION)));
    if (chooser.showSaveDialog(window) != JFileChooser.APPROVE_OPTION) {
      return false;
    }
    Path file = chooser.getSelectedFile().toPath();
    return (!Files.exists(file) || replace(file)) && write(file);
  }

  private boolean replace(Path file) {
    return JOptionPane.showConfirmDialog(
            window,
            Messages.text("save.replace", file.getFileName().toString()),
            Messages.text("save.title"),
            JOptionPane.OK_CANCEL_OPTION)
        == JOptionPane.OK_OPTION;
  }

  /** A site is small: it is written at once. */
  private boolean write(Path file) {
    try {
      sites.write(open.toSave().orElseThrow(), file);
    } catch (IOException e) {
      JOptionPane.showMessageDialog(
          window, e.getMessage(), Messages.text("save.failed"), JOptionPane.WARNING_MESSAGE);
      return false;
    }
    open.saved(file);
    saved.run();
    return true;
  }
}
