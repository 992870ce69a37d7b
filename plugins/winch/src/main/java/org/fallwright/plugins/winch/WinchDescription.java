package org.fallwright.plugins.winch;

import java.util.List;
import java.util.Set;
import org.fallwright.core.pull.Parameter;
import org.fallwright.core.pull.Parameter.Choice;
import org.fallwright.core.pull.SourceDescription;
import org.fallwright.core.pull.SourceDescription.PlaceKind;
import org.fallwright.core.pull.Wording;

/** What a winch is asked about itself, in the order of a form. */
final class WinchDescription {
  static final String BARE = "bare-drum";
  static final String FULL = "full-drum";
  static final String ANY = "any-layer";

  private WinchDescription() {}

  static SourceDescription of() {
    return new SourceDescription(
        "winch",
        say("winch", "malacate (winche)"),
        Set.of(PlaceKind.ANCHOR, PlaceKind.SPOT),
        false,
        List.of(
            Parameter.choice(
                    "kind",
                    say("Kind", "Tipo"),
                    say(
                        "How it takes in its wire and who drives it.",
                        "Cómo recoge su cable de acero y quién lo mueve."),
                    Kind.choices())
                .preset(Kind.THROUGH_ROPE.key()),
            Parameter.number(
                "rated_N",
                "N",
                500,
                1e6,
                say("Rated pull", "Tiro marcado"),
                say(
                    "The pull on its plate. On a drum it counts for the bare drum unless said"
                        + " otherwise below.",
                    "El que lleva marcado. En un tambor vale para el tambor vacío si abajo no se"
                        + " dice otra cosa.")),
            Parameter.choice(
                    "rated_on",
                    say("The rating counts for", "El tiro marcado vale para"),
                    say(
                        "The plate or the manual says for which layer of wire the rated pull is.",
                        "La placa o el manual dice para qué capa de cable de acero vale."),
                    Choice.of(BARE, "the bare drum", "el tambor vacío"),
                    Choice.of(FULL, "the full drum", "el tambor lleno"),
                    Choice.of(ANY, "any layer", "cualquier capa"))
                .onlyWhere("kind", Kind.onDrum())
                .mayBeLeftOut()
                .preset(BARE),
            Parameter.number(
                    "overload_N",
                    "N",
                    500,
                    3e6,
                    say("Overload device acts at", "Seguro de sobrecarga: actúa a"),
                    say(
                        "Shear pin, slipping clutch or valve: the pull of the line at which it"
                            + " gives, on a drum on the bare drum. Leave it out if there is none.",
                        "Pasador, embrague o válvula: el tiro del cable al que cede, en un tambor"
                            + " con el tambor vacío. Déjelo vacío si no tiene."))
                .mayBeLeftOut(),
            Parameter.number(
                    "brake_N",
                    "N",
                    100,
                    3e6,
                    say("Its brake or pawl holds", "Carga que sujeta su freno o trinquete"),
                    say(
                        "The load that it is rated to hold standing still, on a drum on the bare"
                            + " drum. Left out, the rated pull counts.",
                        "La carga que sujeta parado, en un tambor con el tambor vacío. Si queda"
                            + " vacío, vale el tiro marcado."))
                .mayBeLeftOut(),
            Parameter.number(
                    "wire_m",
                    "m",
                    0,
                    500,
                    say("Wire on it", "Cable de acero que tiene"),
                    say(
                        "All the wire, chain or line that belongs to it.",
                        "Todo el cable de acero, la cadena o la cuerda que tiene."))
                .onlyWhere("kind", Kind.withWire()),
            Parameter.number(
                    "wire_breaking_N",
                    "N",
                    500,
                    5e6,
                    say("Breaking load of its wire", "Carga de ruptura de su cable de acero"),
                    say(
                        "From the wire's tag or paper. Left out, the wire is not checked.",
                        "La de la etiqueta o papel. Si queda vacío, no se revisa."))
                .onlyWhere("kind", Kind.withWire())
                .mayBeLeftOut(),
            Parameter.number(
                    "wire_termination",
                    "",
                    0.1,
                    1,
                    say("Strength left by its end", "Lo que deja su punta"),
                    say(
                        "What the eye, clips or hook of its wire leave of the breaking load; clips"
                            + " leave 0.8.",
                        "Parte de la carga de ruptura que dejan el ojo, las abrazaderas o el gancho;"
                            + " con abrazaderas, 0.8."))
                .onlyWhere("kind", Kind.withWire())
                .mayBeLeftOut()
                .preset(0.8),
            Parameter.number(
                    "stroke_m",
                    "m",
                    0.001,
                    1,
                    say("Wire a stroke", "Cable de acero por palancada"),
                    say(
                        "What a full stroke of the lever or a turn of the crank takes in, on a"
                            + " drum on the bare drum.",
                        "Lo que recoge una palancada o una vuelta de la manivela, en"
                            + " un tambor con el tambor vacío."))
                .onlyWhere("kind", Kind.byHand()),
            Parameter.number(
                    "hand_N",
                    "N",
                    10,
                    2000,
                    say("Hand force at the rated pull", "Fuerza de la mano con el tiro marcado"),
                    say(
                        "If plate or manual state it; else state the lever.",
                        "Si la placa o el manual la dicen; si no, dé el largo de la palanca."))
                .onlyWhere("kind", Kind.byHand())
                .mayBeLeftOut(),
            Parameter.number(
                    "lever_m",
                    "m",
                    0.05,
                    2,
                    say("Lever or crank, length", "Largo de la palanca o manivela"),
                    say(
                        "From the axle to the middle of the hand.",
                        "Del eje al centro de la mano."))
                .onlyWhere("kind", Kind.byHand())
                .mayBeLeftOut(),
            Parameter.number(
                    "swing_deg",
                    "deg",
                    5,
                    360,
                    say("Swing of the lever", "Giro de la palanca"),
                    say(
                        "Angle that the lever sweeps one way in a stroke.",
                        "Ángulo que recorre la palanca de ida en una palancada."))
                .onlyWhere("kind", Kind.byLever())
                .mayBeLeftOut()
                .preset(60),
            Parameter.number(
                    "gear_efficiency",
                    "",
                    0.1,
                    1,
                    say("Left by its gear", "Lo que deja pasar su mecanismo"),
                    say(
                        "Share of the hand's work that comes out at the wire. 0.7 where nothing is"
                            + " known.",
                        "Parte del trabajo de la mano que llega al cable de acero; 0.7 si no se sabe."))
                .onlyWhere("kind", Kind.byHand())
                .mayBeLeftOut()
                .preset(0.7),
            Parameter.number(
                    "line_speed_mps",
                    "m/s",
                    0.001,
                    3,
                    say("Line speed", "Velocidad del cable de acero"),
                    say(
                        "Under load, on a drum on the bare drum.",
                        "Con carga, en un tambor con el tambor vacío."))
                .onlyWhere("kind", Kind.byPower()),
            Parameter.flag(
                    "remote",
                    say("Worked from afar", "Se maneja a distancia"),
                    say(
                        "Whether a remote control lets the person stand out of reach of tree and"
                            + " line.",
                        "Si un mando a distancia permite estar fuera del alcance del árbol y del"
                            + " cable de acero."))
                .onlyWhere("kind", Kind.POWERED_DRUM.key())
                .mayBeLeftOut()
                .preset(false),
            Parameter.number(
                    "drum_m",
                    "m",
                    0.02,
                    1,
                    say("Bare drum, diameter", "Diámetro del tambor vacío"),
                    say("Of the barrel without wire.", "Sin cable de acero encima."))
                .onlyWhere("kind", Kind.onDrum()),
            Parameter.number(
                    "rope_m",
                    "m",
                    0.002,
                    0.06,
                    say("Wire, diameter", "Diámetro del cable de acero"),
                    say("Of the wire on the drum.", "Del que va en el tambor."))
                .onlyWhere("kind", Kind.onDrum()),
            Parameter.wholeNumber(
                    "layer",
                    1,
                    Plate.MOST_LAYERS,
                    say("Layers on a full drum", "Capas con el tambor lleno"),
                    say(
                        "Counted on the drum with all its wire on. Leave it out if the drum's width"
                            + " is stated.",
                        "Con todo el cable de acero en el tambor. Déjelo vacío si da el ancho."))
                .onlyWhere("kind", Kind.onDrum())
                .mayBeLeftOut(),
            Parameter.number(
                    "barrel_width_m",
                    "m",
                    0.02,
                    2,
                    say("Drum, width between flanges", "Ancho del tambor entre sus bordes"),
                    say(
                        "With it the layers are reckoned from the wire on the drum.",
                        "Con él las capas se calculan por el cable de acero en el tambor."))
                .onlyWhere("kind", Kind.onDrum())
                .mayBeLeftOut(),
            Parameter.number(
                    "wire_out_m",
                    "m",
                    0,
                    500,
                    say("Wire pulled out at the start", "Cable de acero sacado al empezar"),
                    say(
                        "If the wire is pulled out that far first, fewer layers lie on the drum"
                            + " and it pulls more. Left out, the full drum counts.",
                        "Si primero se saca tanto, quedan menos capas y jala más. Si queda"
                            + " vacío, vale el tambor lleno."))
                .onlyWhere("kind", Kind.onDrum())
                .mayBeLeftOut(),
            Parameter.choice(
                    "contact",
                    say("Line on the capstan", "Cuerda en el tambor"),
                    say("What runs on what.", "Qué corre sobre qué."),
                    Choice.of(
                        "polyester-metal",
                        "polyester or nylon on metal",
                        "poliéster o nailon en metal"),
                    Choice.of("hmpe-metal", "HMPE on metal", "HMPE en metal"),
                    Choice.of("wire-greasy", "wire on greasy steel", "cable en acero engrasado"),
                    Choice.of("wire-dry", "wire on dry steel", "cable en acero seco"))
                .onlyWhere("kind", Kind.CAPSTAN.key()),
            Parameter.number(
                    "turns",
                    "",
                    0.5,
                    10,
                    say("Turns round the capstan", "Vueltas en el tambor"),
                    say(
                        "Of the line; more turns grip more.",
                        "De la cuerda; más vueltas, más agarre."))
                .onlyWhere("kind", Kind.CAPSTAN.key())
                .preset(3),
            Parameter.number(
                    "tail_N",
                    "N",
                    10,
                    200,
                    say("Pull on the tail", "Tiro en la punta suelta"),
                    say(
                        "What one person keeps up on the tail of the line; 50 N is little, 200 N"
                            + " the most.",
                        "Lo que una persona mantiene en la punta suelta; 50 N es poco, 200 N lo"
                            + " máximo."))
                .onlyWhere("kind", Kind.CAPSTAN.key())
                .preset(50),
            Parameter.number(
                    "grab_N",
                    "N",
                    100,
                    1e6,
                    say("Rope grab, rated load", "Bloqueador: carga límite de trabajo"),
                    say(
                        "A device that holds the loaded line when the tail is let go. Leave it out"
                            + " if there is none.",
                        "Un aparato que sujeta la cuerda cargada al soltar la punta. No lo ponga si"
                            + " no hay."))
                .onlyWhere("kind", Kind.CAPSTAN.key())
                .mayBeLeftOut(),
            Parameter.number(
                    "grab_factor",
                    "",
                    1,
                    12,
                    say("Rope grab, its standard's factor", "Factor de diseño del bloqueador"),
                    say(
                        "Breaking load over rated load. Left out, the rated load counts as the"
                            + " breaking load.",
                        "Carga de ruptura entre carga límite de trabajo. Si queda vacío, cuenta"
                            + " como 1."))
                .onlyWhere("kind", Kind.CAPSTAN.key())
                .mayBeLeftOut(),
            Parameter.number(
                    "machine_kg",
                    "kg",
                    200,
                    60_000,
                    say("Mass of the machine it sits on", "Masa de la máquina que lo lleva"),
                    say(
                        "Asked where the winch stands on a spot: the weight on its locked wheels is"
                            + " all that holds it.",
                        "Se pide si está parado en un lugar: solo lo sujeta el peso en sus ruedas"
                            + " bloqueadas."))
                .mayBeLeftOut(),
            Parameter.number(
                    "line_height_m",
                    "m",
                    0,
                    3,
                    say(
                        "Height of the wire on the machine",
                        "Altura del cable de acero en la máquina"),
                    say(
                        "Above the ground, where the wire leaves the winch.",
                        "Sobre el suelo, donde sale."))
                .mayBeLeftOut()
                .preset(0.5)));
  }

  private static Wording say(String english, String spanish) {
    return new Wording(english, spanish);
  }
}
