package org.fallwright.core.kit;

import java.util.List;
import java.util.Locale;
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
    for (Role role : roles) {
      if (roles.indexOf(role) != roles.lastIndexOf(role)) {
        throw new IllegalArgumentException(
            "roles has "
                + role.name().toLowerCase(Locale.ROOT).replace('_', '-')
                + " twice; each may be there once");
      }
    }
    Range.checkOrNull("mass_kg", massKg, 30, 200, "kg");
    Range.checkOrNull("stature_m", statureM, 1, 2.3, "m");
  }
}
