package org.fallwright.core.plan;

import org.fallwright.core.outside.CheckValue;
import org.fallwright.core.reference.Allowances;
import org.junit.jupiter.api.Test;

/** Published proportions of a face. */
class FaceReferenceTest {
  @Test
  void theBoundsAreThePublishedOnes() {
    String etool = "OSHA Logging eTool, Kinds of notches";
    CheckValue.of(etool, "least opening of an open face", 70, "deg")
        .isMet(Allowances.OPEN_FACE_LEAST.value(), 0);
    CheckValue.of("OSHA CPL 2-1.22", "least opening of an open face", 70, "deg")
        .isMet(Allowances.OPEN_FACE_LEAST.value(), 0);
    CheckValue.of(etool, "greatest depth of a face, of D", 1.0 / 3, "")
        .isMet(Allowances.FACE_DEPTH_MOST.value(), 0);
    CheckValue.of("Michigan R 408.15336(3)", "depth of a face, of D", 1.0 / 3, "")
        .isMet(Allowances.FACE_DEPTH_MOST.value(), 0);
    CheckValue.of("HSE/FISA 302", "least depth of a face, of D", 0.2, "")
        .fromMemory()
        .isMet(Allowances.FACE_DEPTH_LEAST.value(), 0);
  }
}
