package org.fallwright.ui.particulars;

import java.awt.BorderLayout;
import java.awt.Component;
import java.util.ArrayList;
import java.util.List;
import java.util.function.BiConsumer;
import javax.swing.BorderFactory;
import javax.swing.Box;
import javax.swing.BoxLayout;
import javax.swing.JCheckBox;
import javax.swing.JLabel;
import javax.swing.JPanel;
import javax.swing.JTextArea;
import org.fallwright.ui.column.Column;
import org.fallwright.ui.text.Messages;

/** The gear with a box for each thing: what is ticked is at hand, and judged with. */
public final class GearPanel extends Column {
  private final JPanel lines = new JPanel();
  private final List<JCheckBox> boxes = new ArrayList<>();
  private GearAtHand shown;
  private BiConsumer<String, Boolean> ticked = (item, atHand) -> {};

  public GearPanel() {
    super(new BorderLayout());
    lines.setLayout(new BoxLayout(lines, BoxLayout.Y_AXIS));
    add(lines, BorderLayout.PAGE_START);
    setBorder(BorderFactory.createEmptyBorder(8, 12, 8, 10));
    getAccessibleContext().setAccessibleName(Messages.text("gear.title"));
  }

  /** Who is told which thing now comes, or stays. */
  public void onTicked(BiConsumer<String, Boolean> listener) {
    ticked = listener;
  }

  /** Shows the gear; null: nothing. */
  public void show(GearAtHand gear) {
    if (gear != null && gear.equals(shown)) {
      return;
    }
    if (gear != null && shown != null && gear.sameBut(shown)) {
      for (int i = 0; i < boxes.size(); i++) {
        boxes.get(i).setSelected(gear.lines().get(i).atHand());
      }
      shown = gear;
      return;
    }
    shown = gear;
    lines.removeAll();
    boxes.clear();
    add(Messages.text(gear == null ? "entered.none" : "gear.note"));
    if (gear != null) {
      gear.lines().forEach(this::line);
      if (!gear.kit().isEmpty()) {
        lines.add(Box.createVerticalStrut(10));
        gear.kit().forEach(this::add);
      }
    }
    revalidate();
    repaint();
  }

  /** The boxes, in the order of the gear. */
  List<JCheckBox> boxes() {
    return boxes;
  }

  private void line(GearAtHand.Line l) {
    JCheckBox box = new JCheckBox(l.item(), l.atHand());
    box.putClientProperty("FlatLaf.styleClass", "h4");
    box.setAlignmentX(Component.LEFT_ALIGNMENT);
    box.setOpaque(false);
    box.getAccessibleContext().setAccessibleDescription(l.what());
    box.addActionListener(e -> ticked.accept(l.item(), box.isSelected()));
    boxes.add(box);
    JLabel what = new JLabel(l.what());
    what.putClientProperty("FlatLaf.styleClass", "caption");
    what.setAlignmentX(Component.LEFT_ALIGNMENT);
    what.setToolTipText(l.what());
    lines.add(Box.createVerticalStrut(4));
    lines.add(box);
    lines.add(what);
  }

  private void add(String text) {
    JTextArea t = new JTextArea(text, 0, 12);
    t.setEditable(false);
    t.setFocusable(false);
    t.setOpaque(false);
    t.setLineWrap(true);
    t.setWrapStyleWord(true);
    t.setBorder(BorderFactory.createEmptyBorder());
    t.setAlignmentX(Component.LEFT_ALIGNMENT);
    lines.add(t);
  }
}
