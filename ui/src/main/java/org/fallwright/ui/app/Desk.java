package org.fallwright.ui.app;

import java.awt.BorderLayout;
import java.awt.CardLayout;
import java.awt.Dimension;
import java.util.EnumSet;
import java.util.List;
import java.util.function.BiConsumer;
import javax.swing.BorderFactory;
import javax.swing.JComponent;
import javax.swing.JPanel;
import javax.swing.JScrollPane;
import javax.swing.JSplitPane;
import javax.swing.JTabbedPane;
import org.fallwright.core.kit.Kit;
import org.fallwright.core.plan.Check;
import org.fallwright.core.plan.Judged;
import org.fallwright.core.site.Fix;
import org.fallwright.core.site.Position;
import org.fallwright.core.site.Site;
import org.fallwright.ui.document.OpenSite;
import org.fallwright.ui.home.SiteMaps;
import org.fallwright.ui.map.GroundPainter;
import org.fallwright.ui.map.Palette;
import org.fallwright.ui.map.PictureDate;
import org.fallwright.ui.map.PlanLayer;
import org.fallwright.ui.map.PlanPainter;
import org.fallwright.ui.map.PlanScene;
import org.fallwright.ui.map.PlanView;
import org.fallwright.ui.particulars.Entered;
import org.fallwright.ui.particulars.EnteredPanel;
import org.fallwright.ui.particulars.GearAtHand;
import org.fallwright.ui.particulars.GearPanel;
import org.fallwright.ui.setups.Answer;
import org.fallwright.ui.setups.AnswerStrip;
import org.fallwright.ui.setups.FindingsPanel;
import org.fallwright.ui.setups.Ways;
import org.fallwright.ui.setups.WaysPanel;
import org.fallwright.ui.side.ProfilePainter;
import org.fallwright.ui.side.ProfilePanel;
import org.fallwright.ui.text.Amounts;
import org.fallwright.ui.text.Messages;

/**
 * The regions of the window: answer strip, what was entered, plan over profile, ways over findings,
 * status. It shows what the open site holds and passes choices back to it.
 */
final class Desk extends JPanel {
  private final OpenSite open;
  private final AnswerStrip strip = new AnswerStrip();
  private final EnteredPanel entered = new EnteredPanel();
  private final GearPanel gear = new GearPanel();
  private final PlanView plan = new PlanView();
  private final ProfilePanel profile = new ProfilePanel();
  private final WaysPanel ways = new WaysPanel();
  private final FindingsPanel findings = new FindingsPanel();
  private final StatusBar status;
  private final CardLayout cards = new CardLayout();
  private final JPanel middle = new JPanel(cards);
  private Look look;
  private boolean picture;
  private Kit kit;

  Desk(OpenSite open, Look look, StatusBar status, StartCard start) {
    super(new BorderLayout());
    this.open = open;
    this.look = look;
    this.status = status;
    strip.putClientProperty("FlatLaf.styleClass", "strip");
    JSplitPane drawings = split(JSplitPane.VERTICAL_SPLIT, plan, profile, 1);
    middle.add(start, "start");
    middle.add(drawings, "site");
    JSplitPane right = split(JSplitPane.VERTICAL_SPLIT, ways, findings, 0.5);
    right.setPreferredSize(new Dimension(450, 600));
    JTabbedPane rail = new JTabbedPane();
    rail.addTab(Messages.text("entered.tab"), scroll(entered));
    rail.addTab(Messages.text("gear.tab"), scroll(gear));
    rail.putClientProperty("JTabbedPane.tabWidthMode", "equal");
    rail.putClientProperty("JTabbedPane.tabAreaAlignment", "fill");
    rail.setPreferredSize(new Dimension(240, 600));
    rail.setMinimumSize(new Dimension(200, 100));
    middle.setPreferredSize(new Dimension(330, 400));
    middle.setMinimumSize(new Dimension(300, 300));
    JSplitPane inner = split(JSplitPane.HORIZONTAL_SPLIT, middle, right, 1);
    add(strip, BorderLayout.PAGE_START);
    add(split(JSplitPane.HORIZONTAL_SPLIT, rail, inner, 0), BorderLayout.CENTER);
    add(status, BorderLayout.PAGE_END);

    ways.onChosen(open::choose);
    findings.onPointed(open::point);
    plan.onPointed(this::pointed);
    plan.addPropertyChangeListener("zoom", e -> scale());
    open.listen(this::changed);
    showAll();
  }

  /**
   * Shows a site on its pictures.
   *
   * @param from the kit that its gear is from; null: not at hand
   */
  void open(Site site, SiteMaps.Opened pictures, Kit from) {
    kit = from;
    gear();
    picture = pictures.ground() != null;
    plan.show(site, pictures.ground(), pictures.fault());
    plan.onFault(this::pictureWords);
    scale();
    pictureWords();
    redraw();
  }

  void look(Look other) {
    look = other;
    showAll();
  }

  /** Who is told which thing of the gear now comes, or stays. */
  void onTicked(BiConsumer<String, Boolean> listener) {
    gear.onTicked(listener);
  }

  /** Where a thing of the gear is, by the kit; null: not known. */
  String whereIs(String item) {
    return kit == null ? null : kit.trucksOf(item).orElse(null);
  }

  Look look() {
    return look;
  }

  PlanView plan() {
    return plan;
  }

  WaysPanel ways() {
    return ways;
  }

  /** Shows the whole site and setup. */
  void fit() {
    open.site().ifPresent(s -> plan.fit(PlanPainter.extent(s, open.chosen().orElse(null))));
    scale();
  }

  /** The regions in the order that F6 walks them. */
  List<JComponent> regions() {
    return List.of(strip, entered, plan, profile, ways, findings);
  }

  private void changed(OpenSite.Change change) {
    switch (change) {
      case PROGRESS -> {
        status.progress(open.progress());
        answer();
      }
      case CHECK -> plan.flag(open.check().map(Check::place).orElse(null));
      case CHOICE -> {
        plan.flag(null);
        answer();
        chosenShown();
        redraw();
        if (open.chosen().isPresent()) {
          plan.reveal(PlanPainter.extent(open.site().orElseThrow(), open.chosen().get()));
          scale();
        }
      }
      case PLAN -> {
        plan.flag(null);
        showAll();
        fit();
      }
      case SITE, UNITS -> {
        plan.flag(null);
        showAll();
      }
    }
    status.next(NextThing.of(open));
  }

  private void showAll() {
    cards.show(middle, open.site().isPresent() ? "site" : "start");
    Amounts amounts = amounts();
    Palette palette = look.palette();
    entered.show(open.site().map(s -> Entered.of(s, amounts)).orElse(null), palette);
    gear();
    status.progress(open.progress());
    pictureWords();
    status.next(NextThing.of(open));
    answer();
    chosenShown();
    scale();
    redraw();
  }

  private void gear() {
    gear.show(open.site().map(s -> GearAtHand.of(s, kit, open.display())).orElse(null));
  }

  private void pictureWords() {
    status.picture(open.site().map(s -> PictureDate.words(s, plan.pictureFault())).orElse(" "));
  }

  private void chosenShown() {
    Judged chosen = open.chosen().orElse(null);
    ways.show(open.plan().map(p -> Ways.of(p, amounts())).orElse(null), chosen, look.palette());
    findings.show(chosen, amounts(), look.palette());
  }

  private void answer() {
    Amounts a = amounts();
    strip.show(answerNow(a), look.palette());
    open.site()
        .ifPresentOrElse(
            s -> {
              strip.show(
                  new Answer.Cell(
                      "case",
                      Messages.text("answer.case.gust", a.speed(s.conditions().gustMps().value())),
                      s.conditions().windTowardDeg() == null
                          ? Messages.text("answer.case.wind-unknown")
                          : Messages.text(
                              "answer.case.wind", a.azimuth(s.conditions().windTowardDeg()))));
              strip.show(
                  new Answer.Cell(
                      "defaults",
                      String.valueOf(Entered.of(s, a).defaults().size()),
                      Messages.text("answer.defaults.note")));
            },
            () -> {
              strip.show(new Answer.Cell("case", "–", ""));
              strip.show(new Answer.Cell("defaults", "–", ""));
            });
  }

  private Answer answerNow(Amounts a) {
    if (open.site().isEmpty()) {
      return Answer.empty(
          Messages.text("answer.word.no-site"),
          open.failure().orElse(Messages.text("answer.no-site")));
    }
    if (open.chosen().isPresent()) {
      Answer answer = Answer.of(open.chosen().get(), a);
      return open.plan().map(answer::inPlan).orElse(answer);
    }
    if (open.plan().isPresent()) {
      return Answer.nothing(open.plan().get());
    }
    return Double.isNaN(open.progress())
        ? Answer.empty(
            Messages.text("answer.word.stopped"),
            open.failure().orElse(Messages.text("answer.stopped")))
        : Answer.empty(Messages.text("answer.word.planning"), Messages.text("answer.planning"));
  }

  private void redraw() {
    Site site = open.site().orElse(null);
    Judged chosen = open.chosen().orElse(null);
    plan.use(look.palette());
    profile.setBackground(look.palette().paper());
    plan.draw(
        site == null
            ? null
            : new PlanScene(
                site,
                chosen,
                amounts(),
                picture ? Palette.DAY : look.palette(),
                GroundPainter.NONE,
                EnumSet.allOf(PlanLayer.class)));
    profile.draw(site == null ? null : new ProfilePainter(site, chosen, amounts(), look.palette()));
  }

  private void pointed(Position p) {
    if (p == null) {
      status.place(" ");
      return;
    }
    Amounts a = amounts();
    String east = a.length(p.eastM());
    String north = a.length(p.northM());
    status.place(
        picture
            ? Messages.text("status.place.picture", east, north, a.length(Fix.PICTURE.errorM()))
            : Messages.text("status.place.plain", east, north));
  }

  private void scale() {
    status.scale(
        open.site().isEmpty() || !plan.hasSite()
            ? " "
            : Messages.text("status.scale", amounts().small(1 / plan.viewport().pixelsPerMetre())));
  }

  private Amounts amounts() {
    return new Amounts(open.display());
  }

  private static JScrollPane scroll(JComponent c) {
    JScrollPane s = new JScrollPane(c);
    s.setBorder(BorderFactory.createEmptyBorder());
    s.setHorizontalScrollBarPolicy(JScrollPane.HORIZONTAL_SCROLLBAR_NEVER);
    return s;
  }

  private static JSplitPane split(int way, JComponent a, JComponent b, double weight) {
    JSplitPane s = new JSplitPane(way, true, a, b);
    s.setResizeWeight(weight);
    s.setBorder(BorderFactory.createEmptyBorder());
    return s;
  }
}
