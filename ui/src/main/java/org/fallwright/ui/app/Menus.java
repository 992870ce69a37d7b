package org.fallwright.ui.app;

import java.awt.Component;
import java.awt.KeyboardFocusManager;
import java.util.List;
import javax.swing.JComponent;
import javax.swing.JMenu;
import javax.swing.JMenuBar;
import javax.swing.JMenuItem;
import javax.swing.KeyStroke;
import javax.swing.SwingUtilities;
import org.fallwright.ui.text.Messages;

/** Menus and keys. No key needs AltGr on any keyboard. */
final class Menus extends JMenuBar {
  private final MainWindow window;

  Menus(MainWindow window, boolean demo) {
    this.window = window;
    JMenu file = menu("menu.file", 'F');
    item(file, "menu.open", "ctrl O", window::choose);
    if (demo) {
      item(file, "menu.demo", "ctrl D", window::openDemo);
    }
    item(file, "menu.save", "ctrl S", () -> window.saving().save());
    item(file, "menu.save-as", "ctrl shift S", () -> window.saving().saveAs());
    item(file, "menu.plan", "F5", window::plan);
    file.addSeparator();
    item(file, "menu.quit", "ctrl Q", window::quit);

    JMenu view = menu("menu.view", 'V');
    item(view, "menu.units", "ctrl U", window::otherUnits);
    item(view, "menu.look", "F9", window::otherLook);
    view.addSeparator();
    item(view, "menu.fit", "ctrl 0", () -> window.desk().fit());
    item(view, "menu.nearer", "ctrl UP", () -> window.desk().plan().step(1));
    item(view, "menu.farther", "ctrl DOWN", () -> window.desk().plan().step(-1));
    item(view, "menu.region", "F6", this::nextRegion);

    JMenu ways = menu("menu.ways", 'W');
    item(ways, "menu.next-way", "alt DOWN", () -> window.desk().ways().step(1));
    item(ways, "menu.former-way", "alt UP", () -> window.desk().ways().step(-1));
    item(ways, "menu.doubt", "F8", window::doubt);

    JMenu help = menu("menu.help", 'H');
    item(help, "menu.cautions", "F1", window::cautions);
    item(help, "menu.about", null, window::about);
  }

  private JMenu menu(String key, char mnemonic) {
    JMenu m = new JMenu(Messages.text(key));
    m.setMnemonic(mnemonic);
    add(m);
    return m;
  }

  private static void item(JMenu menu, String key, String stroke, Runnable act) {
    JMenuItem i = new JMenuItem(Messages.text(key));
    if (stroke != null) {
      i.setAccelerator(KeyStroke.getKeyStroke(stroke));
    }
    i.addActionListener(e -> act.run());
    menu.add(i);
  }

  private void nextRegion() {
    List<JComponent> regions = window.desk().regions();
    Component owner = KeyboardFocusManager.getCurrentKeyboardFocusManager().getFocusOwner();
    int at = -1;
    for (int i = 0; i < regions.size(); i++) {
      if (owner != null && SwingUtilities.isDescendingFrom(owner, regions.get(i))) {
        at = i;
      }
    }
    regions.get((at + 1) % regions.size()).requestFocusInWindow();
  }
}
