package org.fallwright.ui.map;

/** Parts of the plan that can be shown or left out, from the ground upwards. */
public enum PlanLayer {
  GROUND,
  DROP_ZONES,
  TARGETS,
  SIT_BACK,
  FOOTPRINT,
  PEOPLE_RING,
  BIGHTS,
  WIRES,
  TREE,
  ANCHORS,
  SPOTS,
  LINE,
  WAYS_OUT,
  LABELS
}
