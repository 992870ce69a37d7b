package org.fallwright.core.plan;

import java.util.List;
import java.util.function.Supplier;
import org.fallwright.core.pull.PullOffer;
import org.fallwright.core.rules.RuleSet;
import org.fallwright.core.site.Place;
import org.fallwright.core.site.Site;
import org.fallwright.core.units.DisplayUnits;
import org.fallwright.core.zones.Bight;
import org.fallwright.core.zones.OperatorPlace;

/** Whether those who work the source can stand clear, and what holds the line they pull. */
final class People {
  private final Site site;
  private final RuleSet rules;
  private final DisplayUnits in;
  private final Grade grade;

  People(Site site, RuleSet rules, DisplayUnits in, Grade grade) {
    this.site = site;
    this.rules = rules;
    this.in = in;
    this.grade = grade;
  }

  void check(Setup setup, Landing.Zones zones, PullOffer offer) {
    String at = setup.driver() == null ? setup.place() : setup.driver().place();
    Place place = Route.place(site, at);
    if (offer.operators() > 0) {
      // the operator stands at the end of the last leg, a corner of its own angle
      List<Bight> others =
          zones.angles().bights().isEmpty()
              ? List.of()
              : zones.angles().bights().subList(0, zones.angles().bights().size() - 1);
      OperatorPlace o =
          OperatorPlace.of(place.at(), zones.footprint(), others, zones.angles().recoil());
      double height = site.tree().heightM().value();
      double asked = rules.operatorRadiusFactor().value() * height;
      boolean far = rules.operatorRadiusFactor().metBy(o.fromStumpM(), height);
      Supplier<String> stands =
          () ->
              "Who works the source stands "
                  + in.length(o.fromStumpM())
                  + " from the stump; "
                  + in.length(asked)
                  + " are asked";
      if (!far && rules.teamException().yes()) {
        grade.tightAtBest(
            "operator distance",
            o.fromStumpM(),
            asked,
            "m",
            place.at(),
            () -> stands.get() + ": only as one of the team, named on the sheet with the reason.");
      } else {
        grade.rule(
            "operator distance",
            o.fromStumpM(),
            asked,
            "m",
            far
                ? Math.max(1, o.fromStumpM() / asked)
                : Math.min(o.fromStumpM() / asked, Math.nextDown(1.0)),
            place.at(),
            () -> stands.get() + (far ? "." : ", and these rules know no exception."));
      }
      boolean clear = o.outsideFootprint() && o.outsideBights();
      grade.rule(
          "operator clear",
          clear ? 1 : 0,
          1,
          "",
          clear ? Double.POSITIVE_INFINITY : 0,
          place.at(),
          () ->
              clear
                  ? "Who works the source stands outside the footprint and every other angle of the"
                      + " line."
                  : "Who works the source would stand "
                      + (o.outsideFootprint()
                          ? "inside an angle of the line."
                          : "where the tree can fall."));
    }
    if (!offer.captured() && !offer.powered() && offer.operators() > 0) {
      boolean refused = rules.freeHand() == RuleSet.FreeHand.REFUSED;
      String why =
          "People pull with nothing that holds the line"
              + (refused
                  ? "; these rules refuse that."
                  : ": a swaying pull rocks the tree while it is cut. Use a device that holds.");
      if (refused) {
        grade.factored("free hand", 0, 1, "", 0, place.at(), () -> why);
      } else {
        grade.tightAtBest("free hand", 0, 1, "", place.at(), () -> why);
      }
    }
  }
}
