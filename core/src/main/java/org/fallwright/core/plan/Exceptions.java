package org.fallwright.core.plan;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.fallwright.core.rules.RuleSet;
import org.fallwright.core.site.DropZone;
import org.fallwright.core.site.Site;
import org.fallwright.core.site.TakenException;
import org.fallwright.core.site.Target;

/**
 * The exceptions that somebody has taken, and which checks heed one.
 *
 * <p>Heeded: the operator's distance where the rule set knows a team exception; the clearance of a
 * target that the tree does not reach and in which nobody is; the line's clearance to a structure,
 * fence, plant, tree or other thing that it does not touch; the drop zone, the crew's own wish. Not
 * heeded by anything else, above all not by wires, voltages, strengths, anchors or ways out.
 */
final class Exceptions {
  private final Site site;
  private final RuleSet rules;

  Exceptions(Site site, RuleSet rules) {
    this.site = site;
    this.rules = rules;
  }

  /** The exception that a check heeds; empty: none taken, or none allowed. */
  Optional<TakenException> to(Check check) {
    if (site.exceptions().isEmpty()) {
      return Optional.empty();
    }
    return site.exceptions().stream()
        .filter(e -> e.check().equals(check.id()) && check.ratio() > least(check.id()))
        .filter(e -> allowed(e.check()))
        .findFirst();
  }

  /** Ratio that must be passed: something that is hit or touched knows no exception. */
  private static double least(String check) {
    return check.startsWith("inside ") ? -1 : 0;
  }

  private boolean allowed(String check) {
    if (check.equals("operator distance")) {
      return rules.teamException().yes();
    }
    if (check.startsWith("inside ")) {
      String id = check.substring("inside ".length());
      return id.equals("drop zones")
          || site.dropZones().stream().map(DropZone::id).anyMatch(id::equals);
    }
    if (check.startsWith("clear of ")) {
      return target(check.substring("clear of ".length()))
          .filter(
              t ->
                  !t.occupied()
                      && t.kind() != Target.Kind.PLACE_OF_PEOPLE
                      && t.kind() != Target.Kind.BURIED)
          .isPresent();
    }
    if (check.startsWith("line clear of ")) {
      return target(check.substring("line clear of ".length()).replaceFirst(", leg \\d+$", ""))
          .filter(t -> !t.occupied())
          .filter(
              t ->
                  switch (t.kind()) {
                    case STRUCTURE, FENCE, PLANTING, TREE, OTHER -> true;
                    case ROAD, CAR, BURIED, PLACE_OF_PEOPLE -> false;
                  })
          .isPresent();
    }
    return false;
  }

  private Optional<Target> target(String id) {
    return site.targets().stream().filter(t -> t.id().equals(id)).findFirst();
  }

  static String said(TakenException e) {
    return "Exception accepted by " + e.by() + ", " + e.when() + ": " + e.why() + ".";
  }

  /** Every exception taken, a sentence each. */
  List<String> notes() {
    List<String> notes = new ArrayList<>();
    for (TakenException e : site.exceptions()) {
      notes.add(
          allowed(e.check())
              ? "Exception to \""
                  + e.check()
                  + "\", counted as tight: accepted by "
                  + e.by()
                  + ", "
                  + e.when()
                  + ": "
                  + e.why()
                  + "."
              : "An exception to \""
                  + e.check()
                  + "\" was noted by "
                  + e.by()
                  + "; that check knows none, so it changes nothing.");
    }
    return notes;
  }
}
