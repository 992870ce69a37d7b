package org.fallwright.core.plan;

import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.JsonNodeFactory;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.util.List;
import java.util.Locale;
import org.fallwright.core.zones.LayTargets;
import org.locationtech.jts.geom.Geometry;
import org.locationtech.jts.geom.PrecisionModel;
import org.locationtech.jts.io.WKTWriter;

/**
 * The zones of a setup in the plan document. Outlines are well-known text, east and north in metres
 * of the site plane, to the centimetre: one line each, and any map program reads them.
 */
final class ZonesJson {
  private ZonesJson() {}

  /** The zones; null: they were not worked out. */
  static ObjectNode of(Ground g) {
    if (g == null) {
      return null;
    }
    ObjectNode o = JsonNodeFactory.instance.objectNode();
    PlanJson.number(o, "half_angle_deg", g.halfAngleDeg());
    PlanJson.number(o, "people_radius_m", g.peopleRadiusM());
    PlanJson.number(o, "wire_stop_radius_m", g.wireReachM());
    o.put("footprint", text(g.footprint()));
    o.put("slide", text(g.slide()));
    o.put("sit_back", text(g.sitBack()));
    texts(o, "bights", g.bights());
    texts(o, "bridle_bights", g.bridles());
    o.put("recoil", text(g.recoil()));
    ArrayNode stake = o.putArray("at_stake");
    for (LayTargets.Overlap s : g.atStake()) {
      ObjectNode one = stake.addObject();
      one.put("id", s.targetId());
      PlanJson.number(one, "amount", s.amount());
      one.put("unit", s.unit());
    }
    ArrayNode hangs = o.putArray("hang_ups");
    g.hangUps().forEach(hangs::add);
    ArrayNode places = o.putArray("standing_places");
    for (StandingPlace p : g.places()) {
      ObjectNode one = places.addObject();
      one.put("number", p.number());
      one.put("role", p.role().word());
      PlanJson.place(one, "at", p.at());
      one.put("why", p.why());
    }
    ArrayNode clear = o.putArray("clear_before_work");
    for (ClearFirst c : g.clearFirst()) {
      ObjectNode one = clear.addObject();
      one.put("id", c.id());
      one.put("kind", c.kind().name().toLowerCase(Locale.ROOT));
      PlanJson.number(one, "nearest_m", c.nearestM());
      PlanJson.place(one, "at", c.at());
      one.put("act", c.act());
    }
    return o;
  }

  private static void texts(ObjectNode o, String name, List<Geometry> all) {
    ArrayNode array = o.putArray(name);
    all.forEach(g -> array.add(text(g)));
  }

  private static String text(Geometry g) {
    if (g == null) {
      return null;
    }
    WKTWriter writer = new WKTWriter();
    writer.setPrecisionModel(new PrecisionModel(100));
    return writer.write(g);
  }
}
