package org.fallwright.core.plan;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import com.fasterxml.jackson.core.JsonProcessingException;
import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.Set;
import java.util.function.Consumer;
import org.fallwright.core.pull.PullOffer;
import org.fallwright.core.pull.PullRequest;
import org.fallwright.core.pull.PullSource;
import org.fallwright.core.pull.SourceDescription;
import org.fallwright.core.pull.Wording;
import org.fallwright.core.site.Position;
import org.fallwright.core.site.Site;
import org.junit.jupiter.api.Test;
import org.locationtech.jts.geom.Geometry;

/** Zones, people and exceptions of whole setups, on the tiny site with a winch that is worked. */
class GroundZonesPlanTest {
  private static final ObjectMapper JSON = new ObjectMapper();

  /** A winch that one person works by hand. */
  private static final class Worked implements PullSource {
    @Override
    public SourceDescription describe() {
      return new SourceDescription(
          "steady",
          new Wording("Worked", "Worked"),
          Set.of(SourceDescription.PlaceKind.ANCHOR),
          false,
          List.of());
    }

    @Override
    public List<String> modes(ObjectNode parameters) {
      return List.of("pull");
    }

    @Override
    public PullOffer offer(PullRequest request) {
      double pull = request.parameters().get("pull_N").asDouble();
      Wording said = new Wording("as told", "como se dice");
      return PullOffer.giving(pull, pull, new PullOffer.Limit(said, said))
          .holds(pull, true)
          .overrun(0.05)
          .anchor(1, 1)
          .people(PullOffer.Standing.one("winch", "torno"))
          .done();
    }
  }

  private static Setup north() {
    return new Setup(0, 6, 0.03, "L2", List.of(), "steady", "pull", "R1", null);
  }

  private static Judged judge(Consumer<ObjectNode> change) {
    return judge(change, north());
  }

  private static Judged judge(Consumer<ObjectNode> change, Setup setup) {
    return judge(TinySite.site(4_000, change), setup);
  }

  private static Judged judge(Site site, Setup setup) {
    return new Judge(site, () -> List.of(new Worked())).judge(setup);
  }

  private static Optional<Check> check(Judged j, String id) {
    return j.checks().stream().filter(c -> c.id().equals(id)).findFirst();
  }

  private static Verdict verdict(Judged j, String id) {
    return check(j, id).orElseThrow().verdict();
  }

  private static void set(ObjectNode in, String field, String json) {
    try {
      in.set(field, JSON.readTree(json));
    } catch (JsonProcessingException e) {
      throw new IllegalArgumentException(e);
    }
  }

  private static String target(String id, String kind, String shape, String more) {
    return """
        {"id": "%s", "kind": "%s", "shape": %s, "fix": "tapes", "stated_error_m": null,
         "ground_m": 0, "height_m": 3, %s}"""
        .formatted(id, kind, shape, more);
  }

  private static final String ASKS_ONE =
      "\"required_distance_m\": 1, \"occupied\": false, \"may_be_hit\": false, \"movable\": false";

  private static String circle(double e, double n, double r) {
    return String.format(
        Locale.ROOT, "{\"type\": \"circle\", \"centre\": [%s, %s], \"radius_m\": %s}", e, n, r);
  }

  @Test
  void whoWorksTheWinchStandsBesideItTwoMetresBeforeTheAnchor() {
    Judged j = judge(s -> {});
    Position at = place(j, StandingPlace.Role.OPERATOR).at();
    assertThat(at.northM()).isCloseTo(28, within(1e-9));
    assertThat(Math.abs(at.eastM())).isCloseTo(1, within(1e-9));
    assertThat(check(j, "operator distance").orElseThrow().value())
        .isCloseTo(Math.hypot(28, 1), within(1e-9));
    assertThat(verdict(j, "operator off the line")).isEqualTo(Verdict.WORKABLE);
  }

  @Test
  void theStoredEnergyIsAcceptedByNameOrCountsAsTight() {
    Judged accepted = judge(s -> {});
    Check energy = check(accepted, "stored energy").orElseThrow();
    assertThat(energy.verdict()).isEqualTo(Verdict.WORKABLE);
    assertThat(energy.why()).contains("accepted to").contains("whoever works the source");
    assertThat(energy.value()).isBetween(1.0, 100.0);
    Judged nobody = judge(s -> ((ObjectNode) s.get("zones")).putNull("energy"));
    assertThat(verdict(nobody, "stored energy")).isEqualTo(Verdict.TIGHT);
    assertThat(nobody.verdict()).isEqualTo(Verdict.TIGHT);
    Judged less =
        judge(s -> ((ObjectNode) s.at("/zones/energy")).put("up_to_j", energy.value() / 2));
    assertThat(verdict(less, "stored energy")).isEqualTo(Verdict.TIGHT);
    assertThat(check(less, "stored energy").orElseThrow().why()).contains("accepted only");
  }

  @Test
  void aStandingTreeInTheLayIsAHangUp() {
    String ash =
        """
        {"type": "tree", "id": "Ash",
         "place": {"at": [%s, 9], "ground_m": 0, "fix": "tapes", "stated_error_m": null},
         "sling_height_m": 0.5, "rejected": null, "land": null, "species": "white-ash",
         "dbh_m": 0.3, "height_m": 12, "crown_base_m": 4, "crown_radius_m": 2,
         "soil": "free-draining-mineral", "deep_rooting": false, "saturated": false,
         "condition": "sound", "tie_back": false}""";
    Judged in = judge(s -> TinySite.add(s, "anchors", ash.formatted(3)));
    assertThat(verdict(in, "hang-up in Ash")).isEqualTo(Verdict.NOT_WORKABLE);
    assertThat(check(in, "hang-up in Ash").orElseThrow().why()).contains("hang up in Ash");
    assertThat(in.ground().hangUps()).containsExactly("Ash");
    Judged beside = judge(s -> TinySite.add(s, "anchors", ash.formatted(9)));
    assertThat(verdict(beside, "hang-up in Ash")).isEqualTo(Verdict.WORKABLE);
    assertThat(beside.ground().hangUps()).isEmpty();
    Judged far = judge(s -> TinySite.add(s, "anchors", ash.formatted(60)));
    assertThat(check(far, "hang-up in Ash")).isEmpty();
  }

  @Test
  void aTreeDrawnAsATargetIsAHangUpToo() {
    Judged j =
        judge(s -> TinySite.add(s, "targets", target("Yew", "tree", circle(2, 9, 1), ASKS_ONE)));
    assertThat(verdict(j, "clear of Yew")).isEqualTo(Verdict.NOT_WORKABLE);
    assertThat(check(j, "clear of Yew").orElseThrow().why()).contains("hang up in Yew");
    assertThat(j.ground().hangUps()).containsExactly("Yew");
  }

  @Test
  void theDrawnCrownDecidesWhatTheTreeReaches() {
    Consumer<ObjectNode> shed =
        s -> TinySite.add(s, "targets", target("Shed", "structure", circle(6, 9, 1), ASKS_ONE));
    Judged round = judge(shed);
    assertThat(check(round, "clear of Shed").orElseThrow().value()).isPositive();
    // the same tree with a crown that stands out five metres to the east
    Judged drawn =
        judge(
            shed.andThen(
                s ->
                    set(
                        (ObjectNode) s.get("tree"),
                        "crown_outline",
                        "{\"type\": \"polygon\", \"points\": [[-2,-2],[5,-2],[5,2],[-2,2]]}")));
    assertThat(check(drawn, "clear of Shed").orElseThrow().value()).isNegative();
    Judged offset =
        judge(shed.andThen(s -> set((ObjectNode) s.get("tree"), "crown_offset_m", "[3, 0]")));
    assertThat(check(offset, "clear of Shed").orElseThrow().value()).isNegative();
  }

  @Test
  void twoTapesThatCrossTakeTheirPlaceInWhatIsAsked() {
    String farBarn =
        """
        {"id": "Barn", "kind": "structure",
         "shape": {"type": "polygon", "points": [[8, 4], [14, 4], [14, 12], [8, 12]]},
         "fix": "picture", "stated_error_m": null, "ground_m": 0, "height_m": 5, %s}"""
            .formatted(ASKS_ONE);
    Judged loose = judge(s -> TinySite.add(s, "targets", farBarn));
    assertThat(check(loose, "clear of Barn").orElseThrow().limit())
        .isCloseTo(1 + 3 + 0.2, within(1e-9));
    String tie =
        "{\"from\": \"T1\", \"from_at\": null, \"to\": \"Barn\", \"to_at\": [%s], \"distance_m\":"
            + " %s, \"stated_error_m\": null}";
    Judged tied =
        judge(
            s -> {
              TinySite.add(s, "targets", farBarn);
              TinySite.add(s, "tape_ties", tie.formatted("8, 4", Math.hypot(8, 4)));
              TinySite.add(s, "tape_ties", tie.formatted("8, 12", Math.hypot(8, 12)));
            });
    assertThat(check(tied, "clear of Barn").orElseThrow().limit()).isBetween(1.2, 2.0);
    assertThat(check(tied, "clear of Barn").orElseThrow().ratio())
        .isGreaterThan(check(loose, "clear of Barn").orElseThrow().ratio());
  }

  @Test
  void anExceptionMakesAShortClearanceTightAndSaysWho() {
    Consumer<ObjectNode> shed =
        s -> TinySite.add(s, "targets", target("Shed", "structure", circle(4, 9, 1), ASKS_ONE));
    Judged strict = judge(shed);
    Check short1 = check(strict, "clear of Shed").orElseThrow();
    assertThat(short1.value()).isBetween(0.01, 1.39);
    assertThat(short1.verdict()).isEqualTo(Verdict.NOT_WORKABLE);
    Consumer<ObjectNode> taken =
        s ->
            TinySite.add(
                s,
                "exceptions",
                "{\"check\": \"clear of Shed\", \"by\": \"its owner\", \"why\": \"it is empty\","
                    + " \"when\": \"today\"}");
    Judged excepted = judge(shed.andThen(taken));
    Check c = check(excepted, "clear of Shed").orElseThrow();
    assertThat(c.verdict()).isEqualTo(Verdict.TIGHT);
    assertThat(c.why()).contains("its owner").contains("it is empty").contains("today");
    assertThat(c.value()).isEqualTo(short1.value());
    assertThat(excepted.verdict()).isEqualTo(Verdict.TIGHT);
    // what is hit knows no exception, nor a place with people
    Judged hit =
        judge(
            taken.andThen(
                s ->
                    TinySite.add(
                        s, "targets", target("Shed", "structure", circle(1, 9, 1), ASKS_ONE))));
    assertThat(verdict(hit, "clear of Shed")).isEqualTo(Verdict.NOT_WORKABLE);
    Judged occupied =
        judge(
            taken.andThen(
                s ->
                    TinySite.add(
                        s,
                        "targets",
                        target(
                            "Shed",
                            "structure",
                            circle(4, 9, 1),
                            ASKS_ONE.replace("\"occupied\": false", "\"occupied\": true")))));
    assertThat(verdict(occupied, "clear of Shed")).isEqualTo(Verdict.NOT_WORKABLE);
  }

  @Test
  void noExceptionHelpsAgainstWiresStrengthsOrAnchors() {
    String wire =
        """
        {"id": "W", "voltage_kv": 12.47, "voltage_said_by": "owner", "state": "energized",
         "poles": [{"at": [9, -50], "ground_m": 0, "height_m": 8},
                   {"at": [9, 50], "ground_m": 0, "height_m": 8}],
         "sag_m": 0, "fix": "tapes", "stated_error_m": null}""";
    Site site =
        TinySite.site(
            300,
            s -> {
              TinySite.add(s, "wires", wire);
              for (String id :
                  List.of(
                      "wire W in reach", "wire W in the lay", "pull", "usable R1", "ways out")) {
                TinySite.add(
                    s,
                    "exceptions",
                    "{\"check\": \"%s\", \"by\": \"A\", \"why\": \"hurry\", \"when\": \"now\"}"
                        .formatted(id));
              }
            });
    Judged j = judge(site, north());
    assertThat(verdict(j, "wire W in reach")).isEqualTo(Verdict.NOT_WORKABLE);
    assertThat(verdict(j, "pull")).isEqualTo(Verdict.NOT_WORKABLE);
    Plan plan = new Planner(() -> List.of(new Worked())).plan(site);
    assertThat(plan.notes()).filteredOn(n -> n.contains("changes nothing")).hasSize(5);
  }

  @Test
  void aLineSaidToBeDeadNoLongerForbidsTheWorkButIsStillKeptClearOf() {
    String wire =
        """
        {"id": "W", "voltage_kv": 12.47, "voltage_said_by": %s, "state": "%s",
         "poles": [{"at": [%s, -50], "ground_m": 0, "height_m": 8},
                   {"at": [%s, 50], "ground_m": 0, "height_m": 8}],
         "sag_m": 0, "fix": "tapes", "stated_error_m": null}""";
    Judged live =
        judge(s -> TinySite.add(s, "wires", wire.formatted("\"owner\"", "energized", 11, 11)));
    assertThat(verdict(live, "wire W in reach")).isEqualTo(Verdict.NOT_WORKABLE);
    Judged dead =
        judge(
            s -> TinySite.add(s, "wires", wire.formatted("\"owner\"", "dead-and-earthed", 11, 11)));
    assertThat(verdict(dead, "wire W in reach")).isEqualTo(Verdict.TIGHT);
    assertThat(check(dead, "wire W in reach").orElseThrow().why()).contains("owner");
    Judged nobody =
        judge(s -> TinySite.add(s, "wires", wire.formatted("null", "dead-and-earthed", 11, 11)));
    assertThat(verdict(nobody, "wire W in reach")).isEqualTo(Verdict.NOT_WORKABLE);
    Judged over =
        judge(s -> TinySite.add(s, "wires", wire.formatted("\"owner\"", "dead-and-earthed", 3, 3)));
    assertThat(verdict(over, "wire W in the lay")).isEqualTo(Verdict.NOT_WORKABLE);
  }

  @Test
  void whatStandsInTheRingIsClearedFirst() {
    Judged j =
        judge(
            s -> {
              TinySite.add(s, "targets", target("Car", "car", circle(15, 0, 1), ASKS_ONE));
              TinySite.add(s, "targets", target("Far car", "car", circle(40, 0, 1), ASKS_ONE));
              TinySite.add(s, "targets", target("Bed", "planting", circle(-15, 0, 1), ASKS_ONE));
              TinySite.add(
                  s,
                  "people_points",
                  "{\"id\": \"Door\", \"kind\": \"door\", \"at\": [0, -12], \"fix\": \"tapes\","
                      + " \"stated_error_m\": null, \"of\": null}");
            });
    assertThat(j.ground().peopleRadiusM()).isEqualTo(20);
    assertThat(j.ground().clearFirst()).extracting(ClearFirst::id).containsExactly("Door", "Car");
    assertThat(j.ground().clearFirst().get(0).nearestM()).isCloseTo(12 - 0.4, within(1e-9));
    assertThat(j.notes()).anyMatch(n -> n.startsWith("Clear before work") && n.contains("Door"));
    Judged wide =
        judge(
            s -> {
              TinySite.add(s, "targets", target("Far car", "car", circle(40, 0, 1), ASKS_ONE));
              ((ObjectNode) s.get("zones")).put("people_radius", 4.0);
            });
    assertThat(wide.ground().peopleRadiusM()).isEqualTo(40);
    assertThat(wide.ground().clearFirst()).extracting(ClearFirst::id).containsExactly("Far car");
    // a ring of one's own is never less than the rule's
    Judged narrow = judge(s -> ((ObjectNode) s.get("zones")).put("people_radius", 1.0));
    assertThat(narrow.ground().peopleRadiusM()).isEqualTo(20);
  }

  @Test
  void aStatedSlideTakesThePlaceOfHalfTheHeight() {
    Consumer<ObjectNode> steep =
        s -> ((ObjectNode) s.get("anchors").get(0).get("place")).put("ground_m", -6);
    Judged usual = judge(steep);
    Judged stated = judge(steep.andThen(s -> ((ObjectNode) s.get("zones")).put("slide_m", 2.0)));
    double top = usual.ground().footprint().getEnvelopeInternal().getMaxY();
    assertThat(stated.ground().footprint().getEnvelopeInternal().getMaxY())
        .isCloseTo(top - 3, within(0.05));
    assertThat(usual.ground().slide().getArea()).isGreaterThan(stated.ground().slide().getArea());
    assertThat(usual.ground().footprint().buffer(1e-6).covers(usual.ground().slide())).isTrue();
    assertThat(judge(s -> {}).ground().slide()).isNull();
  }

  private static final String BRIDLE =
      """
      {"type": "two-legs", "id": "B1",
       "place": {"at": [0, 25], "ground_m": 0, "fix": "tapes", "stated_error_m": null},
       "sling_height_m": 1, "rejected": null, "land": null, "first": "R1", "second": "R2"}""";

  private static final String SECOND =
      """
      {"type": "rated", "id": "R2",
       "place": {"at": [6, 30], "ground_m": 0, "fix": "tapes", "stated_error_m": null},
       "sling_height_m": 1, "rejected": null, "land": null,
       "breaking_load_N": 200000, "vouched_by": "A"}""";

  @Test
  void aTwoLeggedAnchorHasZonesAndItsLegsAreHeldClear() {
    Consumer<ObjectNode> bridled =
        s -> {
          ((ObjectNode) s.get("anchors").get(0).get("place"))
              .withArray("at")
              .set(0, JSON.getNodeFactory().numberNode(-6.0));
          TinySite.add(s, "anchors", SECOND);
          TinySite.add(s, "anchors", BRIDLE);
          ((ObjectNode) s.at("/gear/sources/0")).putArray("places").add("B1");
        };
    Setup at = new Setup(0, 6, 0.03, "L2", List.of(), "steady", "pull", "B1", null);
    Judged j = judge(bridled, at);
    assertThat(j.ground().bridles()).hasSize(1);
    Geometry inside = j.ground().bridles().get(0);
    assertThat(inside.getEnvelopeInternal().contains(0, 33)).isTrue();
    assertThat(verdict(j, "operator clear"))
        .as("at a corner of its own angle")
        .isEqualTo(Verdict.WORKABLE);
    Judged fenced =
        judge(
            bridled.andThen(
                s ->
                    TinySite.add(
                        s,
                        "targets",
                        target(
                            "Fence",
                            "fence",
                            "{\"type\": \"line\", \"points\": [[3, 20], [3, 40]]}",
                            ASKS_ONE))),
            at);
    assertThat(verdict(fenced, "bridle B1 clear of Fence, leg to R2"))
        .isEqualTo(Verdict.NOT_WORKABLE);
    assertThat(check(fenced, "bridle B1 clear of Fence, leg to R1").map(Check::verdict))
        .isNotEqualTo(Optional.of(Verdict.NOT_WORKABLE));
  }

  @Test
  void thePlacesOfTheCrewAreClear() {
    Judged j = judge(s -> {});
    Ground g = j.ground();
    assertThat(g.places()).extracting(StandingPlace::number).containsExactly(1, 2, 3, 4, 5);
    Position out = place(j, StandingPlace.Role.WAY_OUT).at();
    Position look = place(j, StandingPlace.Role.LOOK_OUT).at();
    for (Position p : List.of(out, look)) {
      org.locationtech.jts.geom.Point at =
          org.fallwright.core.site.Shape.FACTORY.createPoint(
              new org.locationtech.jts.geom.Coordinate(p.eastM(), p.northM()));
      assertThat(g.footprint().intersects(at)).isFalse();
      assertThat(g.sitBack().intersects(at)).isFalse();
      assertThat(g.recoil().intersects(at)).isFalse();
    }
    assertThat(new Position(0, 0).distanceTo(look)).isGreaterThan(g.peopleRadiusM());
    assertThat(new Position(0, 0).distanceTo(out)).isGreaterThanOrEqualTo(7.62);
  }

  private static StandingPlace place(Judged j, StandingPlace.Role role) {
    return j.ground().places().stream().filter(p -> p.role() == role).findFirst().orElseThrow();
  }

  /** The tiny site with a shed and a car, turned and mirrored about the stump. */
  private static Site turned(double deg, boolean mirrored) {
    return TinySite.site(
        4_000,
        s -> {
          set((ObjectNode) s.get("anchors").get(0).get("place"), "at", at(0, 30, deg, mirrored));
          double lean = 175;
          ((ObjectNode) s.at("/tree/lean_azimuth_deg"))
              .put("value", mirrored ? (720 - lean - deg) % 360 : (lean + deg) % 360);
          TinySite.add(
              s,
              "targets",
              target(
                  "Shed",
                  "structure",
                  "{\"type\": \"circle\", \"centre\": %s, \"radius_m\": 1}"
                      .formatted(at(5, 9, deg, mirrored)),
                  ASKS_ONE));
          TinySite.add(
              s,
              "targets",
              target(
                  "Car",
                  "car",
                  "{\"type\": \"circle\", \"centre\": %s, \"radius_m\": 1}"
                      .formatted(at(-9, -9, deg, mirrored)),
                  ASKS_ONE));
        });
  }

  private static String at(double e, double n, double deg, boolean mirrored) {
    Position o = new Position(0, 0);
    double azimuth = o.azimuthTo(new Position(e, n)) + deg;
    Position p = o.along(mirrored ? -azimuth : azimuth, Math.hypot(e, n));
    return String.format(Locale.ROOT, "[%s, %s]", p.eastM(), p.northM());
  }

  @Test
  void turningOrMirroringTheSiteTurnsOrMirrorsZonesAndPlaces() {
    Judged here = judge(turned(0, false), north());
    for (boolean mirrored : new boolean[] {false, true}) {
      double deg = 63;
      double lay = mirrored ? 360 - deg : deg;
      Judged there = judge(turned(deg, mirrored), north().withLay(lay));
      assertThat(there.verdict()).isEqualTo(here.verdict());
      assertThat(there.ground().footprint().getArea())
          .isCloseTo(here.ground().footprint().getArea(), within(0.05));
      for (String id : List.of("clear of Shed", "clear of Car")) {
        assertThat(check(there, id).orElseThrow().value())
            .as(id)
            .isCloseTo(check(here, id).orElseThrow().value(), within(0.02));
      }
      assertThat(there.ground().places()).hasSameSizeAs(here.ground().places());
      for (ClearFirst c : there.ground().clearFirst()) {
        ClearFirst same =
            here.ground().clearFirst().stream()
                .filter(x -> x.id().equals(c.id()))
                .findFirst()
                .orElseThrow();
        assertThat(c.nearestM()).isCloseTo(same.nearestM(), within(0.01));
      }
    }
  }

  @Test
  void oneMoreThingOnTheSiteNeverMakesASetupBetter() {
    Judged without = judge(s -> {});
    String[] more = {
      target("A", "tree", circle(4, 8, 1), ASKS_ONE),
      target("B", "car", circle(-5, 9, 1), ASKS_ONE),
      target("C", "fence", circle(3, -8, 1), ASKS_ONE),
      target("D", "place-of-people", circle(0, 20, 1), ASKS_ONE)
    };
    for (String one : more) {
      Judged with = judge(s -> TinySite.add(s, "targets", one));
      assertThat(with.verdict()).as(one).isGreaterThanOrEqualTo(without.verdict());
      assertThat(with.ground().clearFirst().size())
          .as(one)
          .isGreaterThanOrEqualTo(without.ground().clearFirst().size());
    }
  }

  @Test
  void gapsInTheRulesAreSaid() {
    Site nz = TinySite.site(4_000, s -> s.put("rule_set", "NZ"));
    Plan plan = new Planner(() -> List.of(new Worked())).plan(nz);
    assertThat(plan.notes())
        .anyMatch(
            n ->
                n.contains("nothing on the distance of who works the source")
                    && n.contains("DE-DGUV"))
        .anyMatch(n -> n.contains("strictest of all sets"));
    Site us = TinySite.site(4_000);
    assertThat(new Planner(() -> List.of(new Worked())).plan(us).notes())
        .noneMatch(n -> n.contains("nothing on the distance of who works the source"));
  }

  @Test
  void theZonesStandInThePlanDocument() throws Exception {
    Site site = TinySite.site(4_000);
    Plan plan = new Planner(() -> List.of(new Worked())).plan(site);
    JsonNode zones =
        JSON.readTree(PlanJson.write(site, plan, new PlanJson.Header("1", List.of(), List.of())))
            .at("/setups/0/zones");
    Geometry written =
        new org.locationtech.jts.io.WKTReader().read(zones.path("footprint").asText());
    assertThat(written.getArea())
        .isCloseTo(plan.ranked().get(0).ground().footprint().getArea(), within(0.3));
    assertThat(zones.path("standing_places")).hasSizeGreaterThanOrEqualTo(4);
    assertThat(zones.path("people_radius_m").asDouble()).isEqualTo(20);
    assertThat(zones.path("slide").isNull()).isTrue();
  }
}
