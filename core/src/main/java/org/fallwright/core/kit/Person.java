package org.fallwright.core.kit;

import java.util.List;
import org.fallwright.core.units.Range;

/**
 * Somebody of the crew.
 *
 * @param id name or initials
 * @param roles what the person may do
 * @param massKg mass [kg]; null: not stated
 * @param statureM stature [m]; null: not stated
 */
public record Person(String id, List<Role> roles, Double massKg, Double statureM) {
  /** Parts in the work that not everybody may take. */
  public enum Role {
    FELLER,
    OPERATOR,
    LOOK_OUT,
    TRAFFIC,
    FIRST_AID,
    CLIMBER,
    HAND_LINE
  }

  public Person {
    Range.text("id", id);
    roles = List.copyOf(Range.present("roles", roles));
    if (roles.stream().distinct().count() != roles.size()) {
      throw new IllegalArgumentException("roles has one twice; each may be there once");
    }
    Range.checkOrNull("mass_kg", massKg, 30, 200, "kg");
    Range.checkOrNull("stature_m", statureM, 1, 2.3, "m");
  }
}
