package org.fallwright.core.tree;

import java.util.List;
import org.fallwright.core.site.WeighedSection;

/**
 * Weighed pieces of a tree added up: m = Σ m_i, height of the mass centre z = Σ m_i·z_i / m, each
 * piece's mass taken at its middle.
 *
 * @param massKg mass of all pieces [kg]
 * @param centreM height of their mass centre above the ground [m]
 */
public record SectionSum(double massKg, double centreM) {
  /** The sum of at least one piece. */
  public static SectionSum of(List<WeighedSection> sections) {
    double mass = sections.stream().mapToDouble(WeighedSection::massKg).sum();
    double moment = sections.stream().mapToDouble(s -> s.massKg() * s.midHeightM()).sum();
    return new SectionSum(mass, moment / mass);
  }
}
