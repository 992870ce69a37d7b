package org.fallwright.core.doubt;

import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.JsonNodeFactory;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.util.ArrayList;
import java.util.List;
import org.fallwright.core.plan.Judged;
import org.fallwright.core.plan.Plan;
import org.fallwright.core.plan.PlanJson;
import org.fallwright.core.pull.PullSources;
import org.fallwright.core.site.Site;

/** Writes the doubt of a plan's leading setups for the plan document. */
public final class DoubtJson {
  private DoubtJson() {}

  /** The doubt of every leading setup that was judged over the trials and can move the tree. */
  public static List<ObjectNode> of(Site site, PullSources sources, Plan plan) {
    List<ObjectNode> all = new ArrayList<>();
    if (plan.ranked().isEmpty()) {
      return all;
    }
    Doubts doubts = new Doubts(site, sources);
    for (int i = 0; i < Math.min(Doubted.LEADING, plan.ranked().size()); i++) {
      Judged j = plan.ranked().get(i);
      int rank = i + 1;
      doubts.brief(j.setup()).ifPresent(d -> all.add(node(rank, d)));
    }
    return all;
  }

  private static ObjectNode node(int rank, Doubt d) {
    ObjectNode o = JsonNodeFactory.instance.objectNode();
    o.put("rank", rank);
    o.put("sentence", d.sentence());
    o.put("trials", d.trials());
    PlanJson.number(o, "enough", d.enough());
    PlanJson.number(o, "enough_at_least", d.enoughAtLeast());
    PlanJson.number(o, "never_lets_go", d.neverLetsGo());
    PlanJson.number(o, "margin", d.margin());
    PlanJson.number(o, "margin_as_entered", d.marginAsEntered());
    PlanJson.number(o, "poor_day_margin", d.poorDayMargin());
    ArrayNode compared = o.putArray("compared");
    for (Doubt.Compared c : d.compared()) {
      ObjectNode one = compared.addObject();
      one.put("name", c.name());
      one.put("unit", c.unit());
      PlanJson.number(one, "one_at_a_time", c.oneAtATime());
      PlanJson.number(one, "sampled", c.sampled());
    }
    ArrayNode fails = o.putArray("fails");
    for (Doubt.Failing f : d.fails()) {
      ObjectNode one = fails.addObject();
      one.put("check", f.check());
      PlanJson.number(one, "chance", f.chance());
      PlanJson.number(one, "first", f.first());
    }
    o.put("fails_first", d.failsFirst());
    ArrayNode shares = o.putArray("shares");
    for (Doubt.Share s : d.shares()) {
      ObjectNode one = shares.addObject();
      one.put("input", s.input().word());
      PlanJson.number(one, "share", s.share());
    }
    return o;
  }
}
