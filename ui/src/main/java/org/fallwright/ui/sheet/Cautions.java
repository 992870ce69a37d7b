package org.fallwright.ui.sheet;

import java.util.List;

/** What goes with every plan, on paper and in the plan document. */
public final class Cautions {
  /** Cautions for every pull. */
  public static final List<String> ALWAYS =
      List.of(
          "A planning aid. It approves nothing: the competent person on the site decides, and may"
              + " always say no.",
          "The figures rest on what was entered. Weight, decay, lean, hinge strength and soil are"
              + " never exactly known.",
          "Law, utility rules, permits and makers' ratings at the place come before this sheet.",
          "Any power line within reach of tree, line or people: stop. Its owner makes it dead,"
              + " guards it or stands by. Never guess a voltage.",
          "Picture and map heights are no survey. Tape the distances that matter.",
          "Nobody in the people ring, the drop zone, the line's angle or along its axis while the"
              + " line is loaded or a cut is open, but who has a job there.",
          "No pulling by hand without a captured line, no run-up or jerk with a vehicle, no line"
              + " round a body, no fastening that is not rated.",
          "Rot in stem or hinge, a brittle dead top, a split fork, ice or lifted roots: not against"
              + " the lean without a specialist's own plan.",
          "Stop if: wind rises over the planned gust or turns; lightning; fading light; anyone out"
              + " of sight or radio; anyone in the zone; saw pinched; stem cracks or moves early;"
              + " line, block, anchor or sling slips or sounds; more pull than planned; the tree"
              + " sits back; anything not as briefed.",
          "Hung up: an emergency job with a plan of its own. Mark it off, do not improvise.",
          "Never leave a tree cut and standing.",
          "What is called a default comes from the program, not from law.");

  /** What no plan of this program looks at. */
  public static final List<String> LEFT_OUT =
      List.of(
          "shear together with bending in the hinge, and cuts that are not as planned",
          "the stem's own weight in its bending",
          "what slings, anchors and the sag of the line give way",
          "the tree's own roots before the cut: a proof pull is for that",
          "how far a leg of the line sags or swings, beside what it passes",
          "broken wood that flies, and a tree that rolls",
          "what ground, hedges and plants hide from the look-out");

  private Cautions() {}
}
