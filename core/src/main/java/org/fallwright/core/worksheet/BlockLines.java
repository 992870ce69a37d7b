package org.fallwright.core.worksheet;

import static org.fallwright.core.worksheet.Dimension.LENGTH;
import static org.fallwright.core.worksheet.Dimension.NUMBER;

import org.fallwright.core.line.LegLoads;
import org.fallwright.core.line.Share;
import org.fallwright.core.line.Sheave;
import org.fallwright.core.plan.Reckoned;

/** Loads on the redirect blocks and tension at the source, for each unit of tension at the tree. */
final class BlockLines {
  private final Workings w;
  private final Reckoned r;

  BlockLines(Workings w, Reckoned r) {
    this.w = w;
    this.r = r;
  }

  void write() {
    w.section("Line from the tree to the source");
    w.note(
        "For each unit of tension at the tree. Hauling, a block passes on a part; holding, friction is never credited.");
    if (!w.has("a_E")) {
      w.work(
          "a_E",
          "line on the tree east of the stump's middle",
          "w_a × tan(λ) × sin(γ)",
          LENGTH,
          Basis.GEOMETRY);
      w.work(
          "a_N", "line on the tree north of it", "w_a × tan(λ) × cos(γ)", LENGTH, Basis.GEOMETRY);
    }
    if (r.redirectBlock() != null) {
      Share k = Sheave.of(r.redirectBlock());
      w.given("k_b", k.what(), k.value(), NUMBER, Basis.of(k), k.source());
    }
    w.given("i_1", "tension in the first leg", 1, NUMBER, Basis.STATICS);
    int blocks = r.loads().blocks().size();
    for (int j = 1; j <= blocks; j++) {
      block(j);
    }
    w.work(
        "i_e",
        "tension at the source's line end, hauling",
        "i_" + (blocks + 1),
        NUMBER,
        Basis.STATICS);
    w.compare("i_e", r.loads().sourceEndPerTree(), NUMBER);
  }

  private void block(int j) {
    LegLoads.Block block = r.loads().blocks().get(j - 1);
    String at = r.judged().line().get(j).id();
    int next = j + 1;
    w.work(
        "i_" + next,
        "tension in leg " + next + ", hauling",
        "i_" + j + " ÷ k_b",
        NUMBER,
        Basis.STATICS);
    String e = j == 1 ? "a_E" : "e_" + (j - 1);
    String n = j == 1 ? "a_N" : "n_" + (j - 1);
    String z = j == 1 ? "w_a" : "z_" + (j - 1);
    w.work(
        "x_b" + j,
        "cosine of the angle between the legs at " + at,
        "(("
            + e
            + " − e_"
            + j
            + ") × (e_"
            + next
            + " − e_"
            + j
            + ") + ("
            + n
            + " − n_"
            + j
            + ") × (n_"
            + next
            + " − n_"
            + j
            + ") + ("
            + z
            + " − z_"
            + j
            + ") × (z_"
            + next
            + " − z_"
            + j
            + ")) ÷ ("
            + (j == 1 ? "L_0" : "L_leg" + j)
            + " × L_leg"
            + next
            + ")",
        NUMBER,
        Basis.GEOMETRY);
    w.work(
        "p_h" + j,
        "load on the block at " + at + ", hauling",
        "√(i_" + j + "^2 + i_" + next + "^2 + 2 × i_" + j + " × i_" + next + " × x_b" + j + ")",
        NUMBER,
        Basis.STATICS);
    w.work("p_o" + j, "the same, holding", "√(2 + 2 × x_b" + j + ")", NUMBER, Basis.STATICS);
    w.compare("p_h" + j, block.hauling(), NUMBER);
    w.compare("p_o" + j, block.holding(), NUMBER);
  }
}
