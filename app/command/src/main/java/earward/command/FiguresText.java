package earward.command;

import static earward.block.figure.CaseName.BATTERY_LOW;
import static earward.block.figure.CaseName.DEEPEST;
import static earward.block.figure.CaseName.FULL_OUTPUT;
import static earward.block.figure.CaseName.HOTTEST;
import static earward.block.figure.CaseName.NO_SIGNAL;
import static earward.block.figure.CaseName.STRONG;
import static earward.block.figure.CaseName.TEST;
import static earward.block.figure.CaseName.WEAK;
import static earward.block.figure.CaseName.WORST_TURN;

import earward.block.Conditions;
import earward.block.figure.CaseName;
import earward.block.figure.FigureName;
import earward.block.figure.Quantity;
import earward.block.quantity.Unit;
import earward.engine.CircuitPart;
import earward.engine.Seam;
import earward.kit.design.KitConditions;
import earward.kit.path.Assembly;
import earward.kit.path.PlacedTestPoint;
import earward.kit.review.CleanDepthLimit;
import earward.kit.review.ReviewedKit;
import earward.kit.review.SeamVerdict;
import java.io.PrintWriter;

/** All figures of a kit, for people: first by place, then every one under its name. */
final class FiguresText {
  private final PrintWriter to;
  private final ReviewedKit kit;
  private final Assembly assembly;
  private final PlaceNames names;

  private FiguresText(PrintWriter to, ReviewedKit kit) {
    this.to = to;
    this.kit = kit;
    this.assembly = kit.solved().assembly();
    this.names = new PlaceNames(assembly);
  }

  static void print(PrintWriter to, ReviewedKit kit) {
    FiguresText text = new FiguresText(to, kit);
    to.println(KitHead.line(kit));
    text.testPoints();
    text.seams();
    text.path();
    text.heat();
    text.all();
  }

  private void section(String title, TextTable table) {
    if (!table.isEmpty()) {
      to.println();
      to.println(title);
      table.print(to);
    }
  }

  private String shown(String place, Quantity quantity, CaseName caseName) {
    return Shown.quantity(
        kit.figures().orNaN(new FigureName(place, quantity, caseName)), quantity.unit());
  }

  private void testPoints() {
    TextTable table =
        new TextTable()
            .row("", "place", "DC rest", "DC test", "audio rms", "distortion", "carrier rms", "");
    for (PlacedTestPoint point : assembly.testPoints()) {
      String place = point.place();
      table.row(
          point.reference(),
          place,
          shown(place, Quantity.DC_VOLTS, NO_SIGNAL),
          shown(place, Quantity.DC_VOLTS, TEST),
          shown(place, Quantity.AUDIO_RMS_VOLTS, TEST),
          shown(place, Quantity.DISTORTION, TEST),
          shown(place, Quantity.CARRIER_RMS_VOLTS, TEST),
          names.of(point));
    }
    section("Test points (rest: no signal; test: the test signal)", table);
  }

  private void seams() {
    TextTable table =
        new TextTable()
            .row(
                "into",
                "weak",
                "test",
                "strong",
                "deepest",
                "onward",
                "backward",
                "loss",
                "load ratio cut",
                "headroom",
                "strong",
                "noise",
                "verdict");
    for (Seam seam : assembly.circuit().seams()) {
      String place = "seam." + seam.name();
      String level = "seam." + seam.name().split("\\.", 2)[0];
      table.row(
          seam.name(),
          shown(level, Quantity.AUDIO_RMS_VOLTS, WEAK),
          shown(level, Quantity.AUDIO_RMS_VOLTS, TEST),
          shown(level, Quantity.AUDIO_RMS_VOLTS, STRONG),
          shown(level, Quantity.AUDIO_RMS_VOLTS, DEEPEST),
          shown(place, Quantity.ONWARD_OHMS, TEST),
          shown(place, Quantity.BACKWARD_OHMS, TEST),
          shown(place, Quantity.LOADING_LOSS_DECIBELS, TEST),
          shown(place, Quantity.LOAD_RATIO_WITHOUT, TEST),
          shown(level, Quantity.HEADROOM_DECIBELS, TEST),
          shown(level, Quantity.HEADROOM_DECIBELS, STRONG),
          shown(level, Quantity.NOISE_RMS_VOLTS, TEST),
          SeamVerdict.of(kit.solved(), seam).key());
    }
    section(
        "Seams: audio rms; impedances and loss at the test tone; the detector's load ratio if the path"
            + " ended there; headroom of test and strong signal",
        table);
  }

  private void path() {
    String path = "path";
    CaseName listening = new CaseName("listening");
    TextTable table = new TextTable().row("", "");
    table.row("distortion of the test signal", shown(path, Quantity.DISTORTION, TEST));
    KitConditions conditions = assembly.design().conditions();
    boolean alone = conditions.sidebands().isEmpty() && conditions.circuits().isEmpty();
    table.row(
        "band, -3 dB" + (alone ? " (the front end is not given)" : " (with the front end)"),
        shown(path, Quantity.LOW_EDGE_HERTZ, TEST)
            + " to "
            + shown(path, Quantity.HIGH_EDGE_HERTZ, TEST));
    table.row(
        "largest deviation from the curve wanted",
        shown(path, Quantity.RESPONSE_DEVIATION_DECIBELS, TEST)
            + " at "
            + shown(path, Quantity.RESPONSE_DEVIATION_HERTZ, TEST));
    table.row(
        "largest clean modulation (3 %)",
        shown(path, Quantity.CLEAN_DEPTH, TEST)
            + CleanDepthLimit.of(kit.solved()).map(limit -> ", by " + limit.key()).orElse(""));
    table.row(
        "the same at the worst of the knobs' turn",
        shown(path, Quantity.CLEAN_DEPTH, WORST_TURN)
            + CleanDepthLimit.of(kit.solved(), WORST_TURN)
                .map(limit -> ", by " + limit.key())
                .orElse(""));
    table.row("clipping rule, closed", shown(path, Quantity.CLIPPING_DEPTH, TEST));
    table.row("diode current reverses at", shown(path, Quantity.REVERSAL_DEPTH, TEST));
    table.row("output at the edge of clipping", shown(path, Quantity.CLIP_WATTS, FULL_OUTPUT));
    table.row("output at 10 %", shown(path, Quantity.TEN_PERCENT_WATTS, FULL_OUTPUT));
    table.row("output of the test signal", shown(path, Quantity.OUTPUT_WATTS, TEST));
    table.row(
        "signal to noise (" + band() + ", not weighted)",
        shown(path, Quantity.SIGNAL_TO_NOISE_DECIBELS, TEST));
    table.row(
        "signal to noise (A-weighted)",
        shown(path, Quantity.A_WEIGHTED_SIGNAL_TO_NOISE_DECIBELS, TEST));
    table.row("ripple rejection", shown(path, Quantity.RIPPLE_REJECTION_DECIBELS, TEST));
    table.row("hum of the adaptor", shown(path, Quantity.HUM_RMS_VOLTS, TEST));
    table.row(
        "margin against motor-boating, battery low",
        shown(path, Quantity.RAIL_LOOP_MARGIN_DECIBELS, BATTERY_LOW)
            + " at "
            + shown(path, Quantity.RAIL_LOOP_HERTZ, BATTERY_LOW));
    table.row(
        "sound at the listening distance, full output",
        shown(path, Quantity.SOUND_DECIBELS, FULL_OUTPUT));
    table.row("supply current at rest", shown(path, Quantity.SUPPLY_AMPERES, NO_SIGNAL));
    table.row("supply current, test signal", shown(path, Quantity.SUPPLY_AMPERES, TEST));
    table.row("supply current, full output", shown(path, Quantity.SUPPLY_AMPERES, FULL_OUTPUT));
    table.row("battery life, listening level", shown(path, Quantity.BATTERY_HOURS, listening));
    section("Path", table);
  }

  /** The audio band of the conditions. */
  private String band() {
    Conditions core = assembly.design().conditions().core();
    return Shown.quantity(core.lowestToneHertz(), Unit.HERTZ)
        + " to "
        + Shown.quantity(core.highestToneHertz(), Unit.HERTZ);
  }

  private void heat() {
    TextTable table =
        new TextTable().row("", "part", "dissipation at worst", "junction at worst", "surface");
    for (CircuitPart part : assembly.circuit().parts()) {
      String place = part.name();
      if (kit.figures().find(place, Quantity.JUNCTION_CELSIUS, HOTTEST).isPresent()) {
        table.row(
            names.reference(place),
            place,
            shown(place, Quantity.DISSIPATION_WATTS, HOTTEST),
            shown(place, Quantity.JUNCTION_CELSIUS, HOTTEST),
            shown(place, Quantity.SURFACE_CELSIUS, HOTTEST));
      }
    }
    section("Heat", table);
  }

  private void all() {
    TextTable table = new TextTable().row("figure", "value");
    kit.figures()
        .all()
        .forEach(
            (name, value) -> {
              Unit unit = name.quantity().unit();
              table.row(name.toString(), Shown.quantity(value, unit));
            });
    section("All figures", table);
  }
}
