package org.fallwright.plugins.blocksystem;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Locale;
import java.util.Set;
import java.util.stream.Stream;
import org.fallwright.core.line.Sheave;
import org.fallwright.core.pull.Parameter;
import org.fallwright.core.pull.Parameter.Choice;
import org.fallwright.core.pull.SourceDescription;
import org.fallwright.core.pull.SourceDescription.PlaceKind;
import org.fallwright.core.pull.Wording;

/** What a block system is asked about itself, in the order of a form. */
final class BlockDescription {
  static final String FIXED = "fixed";
  static final String MOVING = "moving";
  static final String ON_PULL_LINE = "pull-line";
  static final String ON_HAUL_PART = "haul-part";

  private static final String[] SIMPLE = {"2", "3", "4", "5", "6"};

  /** Parts of the tackle at the pull line, then of the one that hauls on it. */
  private static final String[] COMPOUND = {"2x2", "2x3", "3x2", "2x4", "4x2", "3x3"};

  private BlockDescription() {}

  static SourceDescription of() {
    List<Parameter> all = new ArrayList<>();
    all.addAll(rigging());
    all.addAll(sheaves());
    all.addAll(strengths());
    all.addAll(holding());
    return new SourceDescription(
        "block-system",
        say("block system", "aparejo de poleas"),
        Set.of(PlaceKind.ANCHOR),
        true,
        all);
  }

  /** The sheaves of a choice made by {@link #sheave}. */
  static Sheave sheaveOf(String key) {
    return Sheave.valueOf(key.toUpperCase(Locale.ROOT).replace('-', '_'));
  }

  private static List<Parameter> rigging() {
    return List.of(
        Parameter.choices(
            "parts",
            say("Parts of line", "Ramales de cuerda"),
            say(
                "How many parts of line pull at the moving block; every number that it can be"
                    + " rigged with. 3x2: a second tackle of 2 parts hauls on one of 3.",
                "Cuántos ramales jalan la polea que se mueve; todos los números con que se puede"
                    + " armar. 3x2: un segundo aparejo de 2 jala uno de 3."),
            Stream.concat(
                    Arrays.stream(SIMPLE).map(n -> Choice.of(n, n + ":1", n + " a 1")),
                    Arrays.stream(COMPOUND).map(BlockDescription::compound))
                .toArray(Choice[]::new)),
        Parameter.choice(
                "form",
                say("Block that the haul part leaves", "Polea de donde sale el ramal de tiro"),
                say(
                    "The fixed block costs one more sheave but lets people stand off to the side."
                        + " Of a compound that of the second tackle.",
                    "La polea fija gasta una rueda más, pero deja trabajar de lado. En uno doble,"
                        + " la del segundo aparejo."),
                Choice.of(FIXED, "the fixed block", "la polea fija"),
                Choice.of(MOVING, "the moving block", "la polea que se mueve"))
            .preset(FIXED),
        Parameter.number(
                "room_m",
                "m",
                Throw.LEAST_ROOM_M,
                200,
                say("Room between its blocks at the start", "Espacio entre sus poleas al empezar"),
                say(
                    "How far apart they can start; less than the take-up needs resets. Left out,"
                        + " the plan tells what is needed.",
                    "Qué tan separadas empiezan; si es menos que lo que se recoge, hay que volver a"
                        + " armar. Si queda vacío, el plan dice cuánto se necesita."))
            .mayBeLeftOut());
  }

  private static Choice compound(String key) {
    int first = key.charAt(0) - '0';
    int second = key.charAt(2) - '0';
    return Choice.of(
        key,
        first * second + ":1, " + first + ":1 hauled by " + second + ":1",
        first * second + " a 1, " + first + " a 1 jalado por " + second + " a 1");
  }

  private static List<Parameter> sheaves() {
    return List.of(
        efficiency(
            "efficiency",
            say("Tension passed on by a sheave", "Tensión que pasa cada polea"),
            say(
                "What is left of the tension after one sheave: 0.9 to 0.98 on bearings, much less"
                    + " on a bare pin or a connector. Left out where each block says its own.",
                "Lo que queda de la tensión después de una polea: 0.9 a 0.98 con balero, mucho menos"
                    + " sobre un perno o un gancho. Vacío si cada polea dice la suya.")),
        sheave("moving_sheave", "Sheaves of the moving block", "Ruedas de la polea que se mueve"),
        efficiency(
            "moving_efficiency",
            say("Moving block, passed on by a sheave", "Polea que se mueve: lo que pasa"),
            ownK()),
        sheave("fixed_sheave", "Sheaves of the fixed block", "Ruedas de la polea fija"),
        efficiency(
            "fixed_efficiency",
            say("Fixed block, passed on by a sheave", "Polea fija: lo que pasa"),
            ownK()),
        sheave("second_sheave", "Sheaves of the second tackle", "Ruedas del segundo aparejo")
            .onlyWhere("parts", COMPOUND),
        efficiency(
                "second_efficiency",
                say("Second tackle, passed on by a sheave", "Segundo aparejo: lo que pasa"),
                ownK())
            .onlyWhere("parts", COMPOUND));
  }

  private static Parameter efficiency(String key, Wording label, Wording help) {
    return Parameter.number(key, "", 0.3, 1, label, help).mayBeLeftOut();
  }

  private static Wording ownK() {
    return say(
        "Measured or stated for this block; in place of its kind.",
        "Medido o dado para esta polea; en lugar de su tipo.");
  }

  private static Parameter sheave(String key, String english, String spanish) {
    return Parameter.choice(
            key,
            say(english, spanish),
            say(
                "Their kind; its low figure is reckoned with.",
                "Su tipo; se calcula con su valor bajo."),
            Choice.of("wire-on-rollers", "wire rope, roller bearings", "cable de acero, rodillos"),
            Choice.of(
                "wire-on-plain-bearings", "wire rope, plain bearings", "cable de acero, bujes"),
            Choice.of("tackle", "common tackle block", "polea común de aparejo"),
            Choice.of("fibre-on-ball-bearings", "fibre rope, ball bearings", "cuerda, con balero"),
            Choice.of("fibre-on-a-bush", "fibre rope, bushed", "cuerda, con buje"),
            Choice.of("rescue-pulley", "rescue pulley", "polea de rescate"),
            Choice.of("connector", "a connector, no sheave", "un conector, sin rueda"))
        .mayBeLeftOut();
  }

  private static List<Parameter> strengths() {
    return List.of(
        Parameter.number(
            "block_rated_N",
            "N",
            100,
            1e7,
            say("Rated load of a block", "Carga límite de trabajo de una polea"),
            say(
                "The working load limit stamped on the weakest block.",
                "La carga límite de trabajo (WLL) marcada en la polea más débil.")),
        Parameter.number(
            "block_factor",
            "",
            1,
            12,
            say("Its standard's factor", "Factor de diseño de la polea"),
            say(
                "Breaking load over rated load that the block's standard asks.",
                "Carga de ruptura entre carga límite de trabajo, según su norma.")),
        Parameter.number(
            "line_breaking_N",
            "N",
            500,
            5e6,
            say("Breaking load of the line", "Carga de ruptura de la cuerda"),
            say(
                "As on the label of the line in the blocks; of two lines the weaker.",
                "La de la etiqueta de la cuerda que va en las poleas; de dos, la más débil.")),
        Parameter.number(
            "line_termination",
            "",
            0.1,
            1,
            say("What its ends leave of that", "Lo que dejan sus puntas"),
            say(
                "Share of the breaking load that knot, splice or eye leaves.",
                "Parte de la carga de ruptura que dejan el nudo, el empalme o el ojo.")),
        Parameter.flag(
                "line_wire_rope",
                say("The line is wire rope", "La cuerda es cable de acero"),
                say(
                    "Wire rope is reckoned with its own factor. Left out, the line is fibre.",
                    "El cable de acero lleva su propio factor. Vacío: es cuerda de fibra."))
            .mayBeLeftOut()
            .preset(false),
        Parameter.number(
            "line_stiffness_N",
            "N",
            1e3,
            1e9,
            say("Stiffness EA of the line", "Rigidez EA de la cuerda"),
            say(
                "Tension over stretch as a share of length; the softest of its range.",
                "Tensión entre alargamiento por metro; la más blanda de su rango.")),
        Parameter.number(
            "line_length_m",
            "m",
            1,
            1000,
            say("Length of the line", "Largo de la cuerda"),
            say(
                "All of the line in the blocks, from end to end; of a compound in the tackle at the"
                    + " pull line.",
                "Toda la cuerda de las poleas, de punta a punta; en uno doble, la del aparejo que"
                    + " va a la cuerda de tiro.")),
        Parameter.number(
                "second_line_length_m",
                "m",
                1,
                1000,
                say("Length of the second tackle's line", "Largo de la cuerda del segundo aparejo"),
                say("From end to end.", "De punta a punta."))
            .onlyWhere("parts", COMPOUND));
  }

  private static List<Parameter> holding() {
    return List.of(
        Parameter.number(
                "capture_N",
                "N",
                100,
                1e6,
                say("Rope grab in it, rated load", "Bloqueador: carga límite de trabajo"),
                say(
                    "A device that holds by itself when whoever hauls lets go. Leave it out if there"
                        + " is none.",
                    "Un aparato que sujeta solo cuando quien jala suelta. Déjelo vacío si no"
                        + " tiene."))
            .mayBeLeftOut(),
        Parameter.number(
                "capture_factor",
                "",
                1,
                12,
                say("Rope grab, its standard's factor", "Factor de diseño del bloqueador"),
                say(
                    "Breaking load over rated load. Left out, 1 counts.",
                    "Carga de ruptura entre carga límite de trabajo. Vacío: cuenta como 1."))
            .mayBeLeftOut(),
        Parameter.choice(
                "capture_at",
                say("Rope grab sits on", "El bloqueador va en"),
                say(
                    "On the haul part it bears one over the parts of the load; on the pull line all"
                        + " of it.",
                    "En el ramal de tiro carga la parte de un ramal; en la cuerda de tiro, todo."),
                Choice.of(ON_PULL_LINE, "the pull line", "la cuerda de tiro"),
                Choice.of(ON_HAUL_PART, "the haul part", "el ramal de tiro"))
            .mayBeLeftOut());
  }

  private static Wording say(String english, String spanish) {
    return new Wording(english, spanish);
  }
}
