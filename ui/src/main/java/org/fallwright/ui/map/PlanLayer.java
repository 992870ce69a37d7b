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
  HANG_UPS,
  WIRES,
  TREE,
  ANCHORS,
  SPOTS,
  LINE,
  WAYS_OUT,
  CLEAR_FIRST,
  STANDING_PLACES,
  LABELS
}
