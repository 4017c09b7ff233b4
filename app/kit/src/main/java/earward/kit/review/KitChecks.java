package earward.kit.review;

import earward.block.Conditions;
import earward.block.Role;
import earward.block.check.Check;
import earward.block.check.Severity;
import earward.block.device.Loudspeaker;
import earward.block.figure.CaseName;
import earward.block.figure.FigureName;
import earward.block.figure.Quantity;
import earward.engine.CircuitPart;
import earward.kit.design.WantedLimits;
import earward.kit.path.Assembly;
import earward.kit.path.PlacedBlock;
import earward.kit.path.PlacedTestPoint;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/**
 * What is wanted of the whole path, as data like the checks of blocks. A figure that a path does
 * not have, since it ends earlier, is not asked for.
 */
final class KitChecks {
  /** What these checks are about. */
  public static final String SUBJECT = "path";

  static final String SOURCE = "the kit design's own conditions";

  /** How far the response may lie from its curve, dB. */
  private static final double MOST_DEVIATION = 4;

  /** Margin of the loop through the rail, dB. */
  private static final double LEAST_LOOP_MARGIN = 10;

  /** Test signal over hum, dB. */
  private static final double LEAST_OVER_HUM = 40;

  private static final double MOST_HEADPHONE_VOLTS = 0.15;

  /** What bears no more than this is worn at the ear (common practice). */
  private static final double MOST_WATTS_AT_THE_EAR = 0.25;

  private KitChecks() {}

  /** Those of the blocks, then those of the path, then those of every part. */
  static List<KitCheck> of(Assembly assembly) {
    List<KitCheck> checks = new ArrayList<>();
    for (PlacedBlock block : assembly.blocks()) {
      for (Check check : block.description().checks()) {
        checks.add(new KitCheck(block.global(check), block.id(), "", true));
      }
    }
    ofPath(assembly).forEach(check -> checks.add(KitCheck.ofPath(check)));
    checks.addAll(PartChecks.of(assembly));
    return checks;
  }

  private static List<Check> ofPath(Assembly assembly) {
    Conditions core = assembly.design().conditions().core();
    WantedLimits wanted = assembly.design().conditions().wanted();
    List<Check> checks = new ArrayList<>(response());
    output(assembly, wanted, checks);
    checks.add(
        Check.atMost(
            "path-low-edge",
            Severity.WEIGH,
            figure(Quantity.LOW_EDGE_HERTZ, CaseName.TEST),
            wanted.lowEdgeHertz(),
            SOURCE));
    checks.add(
        Check.atMost(
            "path-distortion",
            Severity.WEIGH,
            figure(Quantity.DISTORTION, CaseName.TEST),
            wanted.distortion(),
            SOURCE));
    checks.add(
        Check.atLeast(
            "motor-boating",
            Severity.WEIGH,
            figure(Quantity.RAIL_LOOP_MARGIN_DECIBELS, CaseName.BATTERY_LOW),
            LEAST_LOOP_MARGIN,
            "common practice: a loop keeps 10 dB from sustaining itself"));
    checks.add(
        Check.atLeast(
            "hum",
            Severity.WEIGH,
            figure(Quantity.SIGNAL_TO_HUM_DECIBELS, CaseName.TEST),
            LEAST_OVER_HUM,
            "common practice: hum 40 dB below the test signal is not noticed in a small receiver"));
    if (!endsAtThePowerStage(assembly)) {
      checks.add(
          Check.atLeast(
              "little-output",
              Severity.WEIGH,
              figure(Quantity.CLIP_WATTS, CaseName.FULL_OUTPUT),
              core.wantedWatts(),
              SOURCE));
    }
    wanted
        .batteryHours()
        .ifPresent(
            hours ->
                checks.add(
                    Check.atLeast(
                        "battery-life",
                        Severity.WEIGH,
                        figure(Quantity.BATTERY_HOURS, new CaseName("listening")),
                        hours,
                        SOURCE)));
    return checks;
  }

  /** The response held against the curve that is wanted, both ways. */
  private static List<Check> response() {
    FigureName deviation = figure(Quantity.RESPONSE_DEVIATION_DECIBELS, CaseName.TEST);
    String source = "common practice: a band holds within 4 dB of its curve";
    return List.of(
        Check.atMost("path-response", Severity.WEIGH, deviation, MOST_DEVIATION, source),
        Check.atLeast("path-response", Severity.WEIGH, deviation, -MOST_DEVIATION, source));
  }

  private static void output(Assembly assembly, WantedLimits wanted, List<Check> checks) {
    if (endsAtThePowerStage(assembly)) {
      return;
    }
    checks.add(
        Check.atLeast(
            "little-gain",
            Severity.WEIGH,
            figure(Quantity.OUTPUT_WATTS, new CaseName("weak-at-full-volume")),
            wanted.listeningWatts(),
            SOURCE));
    checks.add(
        Check.atLeast(
            "little-output-at-end",
            Severity.WEIGH,
            figure(Quantity.CLIP_WATTS, CaseName.BATTERY_LOW),
            wanted.listeningWatts(),
            SOURCE));
    atTheEar(assembly)
        .ifPresent(
            place ->
                checks.add(
                    Check.atMost(
                        "headphone-loudness",
                        Severity.WEIGH,
                        new FigureName(place, Quantity.AUDIO_RMS_VOLTS, CaseName.FULL_VOLUME),
                        MOST_HEADPHONE_VOLTS,
                        "EN 50332-2: 150 mV at a headphone's terminals")));
  }

  /** Where the voltage across what is worn at the ear is found; empty where nothing is. */
  private static Optional<String> atTheEar(Assembly assembly) {
    for (CircuitPart part : assembly.circuit().parts()) {
      if (part.device() instanceof Loudspeaker speaker
          && speaker.model().ratedWatts() <= MOST_WATTS_AT_THE_EAR) {
        String hot = part.nodes().get(speaker.terminals().get(0));
        boolean bridged =
            assembly.circuit().seams().stream().anyMatch(seam -> seam.name().endsWith(".minus"));
        return bridged
            ? Optional.of(SUBJECT)
            : assembly.testPoints().stream()
                .filter(point -> point.node().equals(hot))
                .map(PlacedTestPoint::place)
                .findFirst()
                .or(() -> Optional.of(SUBJECT));
      }
    }
    return Optional.empty();
  }

  /** A power stage without its load gives no output that could be wanted. */
  private static boolean endsAtThePowerStage(Assembly assembly) {
    int blocks = assembly.path().size();
    return blocks > 0 && assembly.path().get(blocks - 1).type().role() == Role.POWER;
  }

  private static FigureName figure(Quantity quantity, CaseName caseName) {
    return new FigureName(SUBJECT, quantity, caseName);
  }
}
