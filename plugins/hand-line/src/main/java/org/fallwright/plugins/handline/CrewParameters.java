package org.fallwright.plugins.handline;

import java.util.ArrayList;
import java.util.List;
import java.util.Set;
import org.fallwright.core.pull.Parameter;
import org.fallwright.core.pull.Parameter.Choice;
import org.fallwright.core.pull.SourceDescription;
import org.fallwright.core.pull.SourceDescription.PlaceKind;
import org.fallwright.core.pull.Wording;

/** What a site says of people on a hand line, for the form and for {@link Gang}. */
final class CrewParameters {
  /** People whose mass and stature can be told; more than these add nothing. */
  static final int TOLD = 7;

  private CrewParameters() {}

  static SourceDescription description() {
    List<Parameter> all = new ArrayList<>(posture());
    all.addAll(capture());
    all.addAll(haul());
    for (int i = 2; i <= TOLD; i++) {
      all.add(
          Parameter.number(
                  "mass_" + i + "_kg",
                  "kg",
                  30,
                  200,
                  new Wording("Mass of person " + i, "Peso de la persona " + i + " (kg)"),
                  new Wording(
                      "Left out: as the first.", "Si se deja vacío: como la primera persona."))
              .mayBeLeftOut());
      all.add(
          Parameter.number(
                  "stature_" + i + "_m",
                  "m",
                  1.2,
                  2.3,
                  new Wording("Stature of person " + i, "Estatura de la persona " + i),
                  new Wording(
                      "Left out: as the first.", "Si se deja vacío: como la primera persona."))
              .mayBeLeftOut());
    }
    return new SourceDescription(
        "hand-line",
        new Wording("hand line", "cuerda jalada a mano"),
        Set.of(PlaceKind.SPOT),
        false,
        all);
  }

  private static List<Parameter> posture() {
    return List.of(
        Parameter.wholeNumber(
            "people",
            1,
            20,
            new Wording("People", "Personas"),
            new Wording(
                "How many work the line; more than seven add nothing.",
                "Cuántas trabajan la cuerda; más de siete no agregan nada.")),
        Parameter.number(
                "person_mass_kg",
                "kg",
                30,
                200,
                new Wording("Mass of a person", "Peso de una persona (kg)"),
                new Wording(
                    "Of the first, and of all who are not told one by one. Left out: a light adult"
                        + " counts for the pull and a heavy one for what the parts must bear.",
                    "De la primera, y de todas las que no se dicen una por una. Vacío: cuenta un"
                        + " adulto ligero para jalar y uno pesado para lo que aguantan las piezas."))
            .mayBeLeftOut(),
        Parameter.number(
                "stature_m",
                "m",
                1.2,
                2.3,
                new Wording("Stature", "Estatura"),
                new Wording(
                    "Of the first, and of all who are not told one by one. Left out: a short adult.",
                    "De la primera, y de todas las que no se dicen una por una. Vacío: un adulto"
                        + " bajo."))
            .mayBeLeftOut(),
        Parameter.number(
                "lean_back_deg",
                "deg",
                0,
                45,
                new Wording("Lean back of the body", "Inclinación del cuerpo hacia atrás"),
                new Wording(
                    "From upright, away from the tree, feet planted.",
                    "Desde la vertical, alejándose del árbol, con los pies firmes."))
            .preset(20),
        Parameter.number(
                "hand_height_m",
                "m",
                0.3,
                2,
                new Wording("Hands above the feet", "Altura de las manos"),
                new Wording(
                    "Height of the line in the hands above the soles.",
                    "Altura de la cuerda en las manos desde la suela."))
            .preset(1),
        Parameter.number(
                "hand_ahead_m",
                "m",
                -0.5,
                1,
                new Wording(
                    "Hands ahead of the feet, to the tree",
                    "Manos delante de los pies, hacia el árbol"),
                new Wording(
                    "Along the ground; negative where the hands are behind the feet.",
                    "A lo largo del suelo; negativo si las manos quedan atrás de los pies."))
            .preset(0.3));
  }

  private static List<Parameter> capture() {
    String device = Capture.DEVICE.key;
    String inHand = Capture.TURNS_IN_HAND.key;
    String tied = Capture.TURNS_TIED.key;
    return List.of(
        Parameter.flag(
            "captured",
            new Wording("Something anchored holds the line", "Algo anclado sostiene la cuerda"),
            new Wording(
                "Whether a device or turns on something fixed keep the line when people let go."
                    + " Without it people can pull a tree over and never hold one.",
                "Si un aparato o unas vueltas en algo fijo sostienen la cuerda cuando la gente afloja."
                    + " Sin eso la gente puede tumbar un árbol, pero nunca sostenerlo.")),
        Parameter.choice(
                "capture_by",
                new Wording("What holds it", "Qué la sostiene"),
                new Wording(
                    "Left out: a device whose rating is not known.",
                    "Vacío: un aparato cuya carga límite no se sabe."),
                Choice.of(
                    device, "device that lets the line in only", "aparato que solo deja entrar"),
                Choice.of(inHand, "turns, tail in a hand", "vueltas, con la punta en la mano"),
                Choice.of(tied, "turns, tied off", "vueltas amarradas"))
            .mayBeLeftOut(),
        Parameter.number(
                "capture_rated_N",
                "N",
                100,
                1e6,
                new Wording("Rated load of what holds", "Carga límite de lo que sostiene"),
                new Wording(
                    "The least of device, sling and what it hangs on or the turns go round. Left out:"
                        + " no more counts as held than the crew pulls.",
                    "La menor de aparato, eslinga y aquello de donde cuelga o donde van las vueltas."
                        + " Vacío: no cuenta más de lo que jala la cuadrilla."))
            .mayBeLeftOut()
            .onlyWhere("capture_by", device, inHand, tied),
        Parameter.number(
                "capture_factor",
                "",
                1,
                12,
                new Wording("Its design factor", "Su factor de diseño"),
                new Wording(
                    "Breaking load over rated load; left out: 1.",
                    "Carga de ruptura entre carga límite; vacío: 1."))
            .mayBeLeftOut()
            .onlyWhere("capture_by", device, inHand, tied),
        Parameter.choice(
                "turns_on",
                new Wording("The turns go round", "Las vueltas van en"),
                new Wording(
                    "Rope and what it is wound on.", "La cuerda y aquello donde se enrolla."),
                Choice.of("rope-on-bark", "rope on bark", "cuerda sobre corteza"),
                Choice.of("polyester-on-metal", "polyester on metal", "poliéster sobre metal"),
                Choice.of("hmpe-on-metal", "HMPE on metal", "HMPE sobre metal"))
            .onlyWhere("capture_by", inHand),
        Parameter.number(
                "turns",
                "",
                0.25,
                8,
                new Wording("Turns", "Vueltas"),
                new Wording(
                    "Full turns, halves and quarters too.", "Vueltas completas; también medias."))
            .onlyWhere("capture_by", inHand),
        Parameter.number(
                "tail_N",
                "N",
                1,
                200,
                new Wording("Force on the tail", "Fuerza en la punta"),
                new Wording(
                    "What one hand keeps on the tail; left out: 50 N, 11 lbf.",
                    "Lo que una mano mantiene en la punta; vacío: 50 N, 5 kgf."))
            .mayBeLeftOut()
            .onlyWhere("capture_by", inHand));
  }

  private static List<Parameter> haul() {
    return List.of(
        Parameter.choice(
                "haul",
                new Wording("How they take line in", "Cómo recogen la cuerda"),
                new Wording(
                    "Walking they pull less than standing, and need room behind them; hand over hand"
                        + " only one hand pulls. Left out: what they keep up standing.",
                    "Caminando jalan menos que parados y necesitan espacio atrás; mano tras mano solo"
                        + " jala una mano. Vacío: lo que sostienen parados."),
                Choice.of(Haul.WALKING.key, "walking back", "caminando hacia atrás"),
                Choice.of(Haul.HAND_OVER_HAND.key, "hand over hand", "mano tras mano"))
            .mayBeLeftOut(),
        Parameter.number(
                "line_diameter_m",
                "m",
                0.004,
                0.06,
                new Wording("Diameter of the line they hold", "Diámetro de la cuerda que agarran"),
                new Wording(
                    "Only where they haul a block system's line; else the pull line's counts.",
                    "Solo si jalan la cuerda de un aparejo; si no, cuenta la cuerda de tiro."))
            .mayBeLeftOut());
  }
}
