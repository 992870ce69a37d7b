package org.fallwright.plugins.vehicle;

import java.util.ArrayList;
import java.util.List;
import java.util.Set;
import org.fallwright.core.pull.Parameter;
import org.fallwright.core.pull.Parameter.Choice;
import org.fallwright.core.pull.SourceDescription;
import org.fallwright.core.pull.SourceDescription.PlaceKind;
import org.fallwright.core.pull.Wording;

/** What a site says of a vehicle, for the form and for {@link VehicleFigures}. */
final class VehicleParameters {
  private static final String BY_CLASS = " Left out: the class's stand-in.";
  private static final String POR_CLASE = " Vacío: el valor supuesto de la clase.";

  private VehicleParameters() {}

  static SourceDescription description() {
    List<Parameter> all = new ArrayList<>();
    all.add(kind());
    all.addAll(body());
    all.addAll(drive());
    all.addAll(soil());
    all.add(parked());
    all.addAll(towPoint());
    return new SourceDescription(
        "vehicle", new Wording("vehicle", "vehículo"), Set.of(PlaceKind.SPOT), false, all);
  }

  private static Parameter kind() {
    return Parameter.choice(
            "class",
            new Wording("Class", "Clase"),
            new Wording(
                "Fills what is left out with stand-ins on the safe side; two weighbridge slips and a"
                    + " tape are better.",
                "Rellena lo que falta con valores supuestos del lado seguro; dos boletos de báscula y"
                    + " una cinta son mejores."),
            Choice.of(VehicleClass.WAGON.key, "four-wheel-drive wagon", "camioneta cerrada 4x4"),
            Choice.of(VehicleClass.PICK_UP.key, "pick-up", "camioneta"),
            Choice.of(VehicleClass.HEAVY_PICK_UP.key, "heavy pick-up", "camioneta pesada"),
            Choice.of(VehicleClass.MEDIUM_TRUCK.key, "medium truck", "camión mediano"),
            Choice.of(
                VehicleClass.TRACTOR_2WD.key,
                "tractor, two-wheel drive",
                "tractor de tracción simple"),
            Choice.of(
                VehicleClass.TRACTOR_4WD.key,
                "tractor, four-wheel drive",
                "tractor de tracción doble"),
            Choice.of(VehicleClass.COMPACT_LOADER.key, "compact loader", "minicargador"),
            Choice.of(VehicleClass.SKIDDER.key, "skidder", "tractor forestal de arrastre"))
        .mayBeLeftOut();
  }

  private static List<Parameter> body() {
    return List.of(
        filled(
            "mass_kg",
            "kg",
            300,
            60_000,
            new Wording("Mass", "Peso (kg)"),
            "As it stands there, with load and driver.",
            "Como está ahí, con carga y conductor."),
        filled(
            "front_share",
            "",
            0.1,
            0.9,
            new Wording("Share on the front axle", "Parte en el eje delantero"),
            "Front axle's share of the weight on level ground: 0.55 is 55 %.",
            "Parte del peso en el eje delantero, en plano: 0.55 es 55 %."),
        axle("front_axle_kg", new Wording("Front axle, weighed", "Eje delantero en báscula (kg)")),
        axle("rear_axle_kg", new Wording("Rear axle, weighed", "Eje trasero en báscula (kg)")),
        filled(
            "wheelbase_m",
            "m",
            1,
            8,
            new Wording("Wheelbase", "Distancia entre ejes"),
            "From axle to axle.",
            "De un eje al otro."),
        filled(
            "cg_height_m",
            "m",
            0.2,
            2.5,
            new Wording("Height of the mass centre", "Altura del centro de peso"),
            "Above the ground; when not known take it high.",
            "Sobre el suelo; si no se sabe, tómela alta."),
        filled(
            "hitch_height_m",
            "m",
            0.1,
            2,
            new Wording("Height of the tow point", "Altura del punto de enganche"),
            "Above the ground.",
            "Sobre el suelo."),
        filled(
            "overhang_m",
            "m",
            0,
            4,
            new Wording("Tow point behind the rear axle", "Enganche detrás del eje trasero"),
            "Along the vehicle.",
            "A lo largo del vehículo."));
  }

  private static Parameter filled(
      String key,
      String unit,
      double least,
      double most,
      Wording label,
      String english,
      String spanish) {
    return Parameter.number(
            key, unit, least, most, label, new Wording(english + BY_CLASS, spanish + POR_CLASE))
        .mayBeLeftOut();
  }

  private static Parameter axle(String key, Wording label) {
    return Parameter.number(
            key,
            "kg",
            50,
            40_000,
            label,
            new Wording(
                "From a weighbridge slip, both axles, in place of mass and share.",
                "Del boleto de báscula, los dos ejes, en lugar de peso y parte."))
        .mayBeLeftOut();
  }

  private static List<Parameter> drive() {
    return List.of(
        Parameter.choices(
            "drives",
            new Wording("Drives", "Tracción"),
            new Wording(
                "Every drive that can be engaged; each is tried.",
                "Todas las tracciones que se pueden poner; se prueba cada una."),
            Choice.of("rwd", "rear axle", "eje trasero"),
            Choice.of("fwd", "front axle", "eje delantero"),
            Choice.of("awd", "all wheels", "todas las llantas")),
        Parameter.choices(
                "locked",
                new Wording("Locked differentials", "Diferenciales bloqueados"),
                new Wording(
                    "An open one lets the worst wheel set the pull. Left out: as if every wheel gave"
                        + " what it has.",
                    "Uno abierto deja que la peor llanta fije el tiro. Vacío: como si cada llanta diera"
                        + " lo suyo."),
                Choice.of("none", "none", "ninguno"),
                Choice.of("front", "front", "delantero"),
                Choice.of("centre", "centre", "central"),
                Choice.of("rear", "rear", "trasero"))
            .mayBeLeftOut(),
        Parameter.number(
                "worse_side_grip",
                "",
                0,
                1.5,
                new Wording("Grip of the worse side", "Agarre del peor lado"),
                new Wording(
                    "Where one side's wheels stand on worse ground, 0.2 on wet grass.",
                    "Si las llantas de un lado pisan peor suelo; 0.2 en pasto mojado."))
            .mayBeLeftOut(),
        Parameter.choice(
                "tyres",
                new Wording("Tyres", "Llantas"),
                new Wording(
                    "No tyre counts for more pull than the ground's figure, only for what the parts"
                        + " must bear; worn ones, and chains or lugs on pavement, count for less.",
                    "Ninguna llanta cuenta para jalar más que el valor del suelo, solo para lo que"
                        + " aguantan las piezas; gastadas, o cadenas o tacos sobre pavimento, cuentan"
                        + " menos."),
                Choice.of(Tyres.ROAD.key, "road", "de carretera"),
                Choice.of(Tyres.WORN.key, "worn", "gastadas"),
                Choice.of(Tyres.ALL_TERRAIN.key, "all-terrain", "todo terreno"),
                Choice.of(Tyres.FIELD_LUGS.key, "field lugs", "agrícolas, de tacos"),
                Choice.of(Tyres.CHAINS.key, "chains", "con cadenas"))
            .mayBeLeftOut());
  }

  private static List<Parameter> soil() {
    return List.of(
        Parameter.choice(
                "traction_by",
                new Wording("Pull worked out by", "Tiro calculado por"),
                new Wording(
                    "The grip of the ground, or for field tyres on soil the published traction"
                        + " equation. Left out: grip.",
                    "El agarre del suelo o, con llantas agrícolas en tierra, la ecuación publicada."
                        + " Vacío: agarre."),
                Choice.of("grip", "grip of the ground", "agarre del suelo"),
                Choice.of("cone-index", "soil strength", "resistencia de la tierra"))
            .mayBeLeftOut(),
        Parameter.number(
                "cone_index_kPa",
                "kPa",
                100,
                5000,
                new Wording("Cone index", "Índice de cono"),
                new Wording(
                    "Read from a cone penetrometer. Left out, on grass or earth: a usual figure, and"
                        + " never more than the ground's grip.",
                    "Leído con penetrómetro de cono. Vacío, en pasto o tierra: un valor común, y nunca"
                        + " más que el agarre del suelo."))
            .mayBeLeftOut()
            .onlyWhere("traction_by", "cone-index"),
        tyre("tyre_width_m", 0.1, 1.2, "Rear tyre, width", "Llanta trasera, ancho"),
        tyre("tyre_diameter_m", 0.4, 2.5, "Rear tyre, diameter", "Llanta trasera, diámetro"),
        tyre("front_tyre_width_m", 0.1, 1.2, "Front tyre, width", "Llanta delantera, ancho"),
        tyre(
            "front_tyre_diameter_m",
            0.4,
            2.5,
            "Front tyre, diameter",
            "Llanta delantera, diámetro"));
  }

  private static Parameter tyre(
      String key, double least, double most, String english, String spanish) {
    return Parameter.number(
            key,
            "m",
            least,
            most,
            new Wording(english, spanish),
            new Wording("Asked where that axle drives.", "Se pide si ese eje da tracción."))
        .mayBeLeftOut()
        .onlyWhere("traction_by", "cone-index");
  }

  private static Parameter parked() {
    return Parameter.choice(
            "parked_by",
            new Wording("Kept from rolling by", "Frenado con"),
            new Wording(
                "When it stands and holds. Left out: all wheels.",
                "Cuando está parado y sostiene. Vacío: todas las llantas."),
            Choice.of(
                Parked.ALL_WHEELS.key, "brake or gear on all wheels", "freno o marcha en todas"),
            Choice.of(Parked.CHOCKS.key, "chocks at every wheel", "cuñas en cada llanta"),
            Choice.of(
                Parked.REAR_BRAKE.key,
                "parking brake on the rear wheels",
                "freno de mano en las traseras"))
        .mayBeLeftOut();
  }

  private static List<Parameter> towPoint() {
    return List.of(
        Parameter.number(
            "tow_point_N",
            "N",
            500,
            1e6,
            new Wording("Rated load of the tow point", "Carga límite del punto de enganche"),
            new Wording(
                "As marked; an unmarked tow point is not to be used.",
                "La marcada; un enganche sin marca no se usa.")),
        Parameter.number(
            "tow_point_factor",
            "",
            1,
            12,
            new Wording("Design factor of the tow point", "Factor de diseño del enganche"),
            new Wording(
                "Breaking load over rated load; 1 where it is not known.",
                "Carga de ruptura entre carga límite; 1 si no se sabe.")));
  }
}
