package earward.command;

import static earward.block.figure.CaseName.BATTERY_LOW;
import static earward.block.figure.CaseName.DEEPEST;
import static earward.block.figure.CaseName.FULL_OUTPUT;
import static earward.block.figure.CaseName.FULL_VOLUME;
import static earward.block.figure.CaseName.HOTTEST;
import static earward.block.figure.CaseName.NO_SIGNAL;
import static earward.block.figure.CaseName.STRONG;
import static earward.block.figure.CaseName.TEST;
import static earward.block.figure.CaseName.WEAK;
import static earward.block.figure.CaseName.WORST_TURN;

import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import earward.block.Role;
import earward.block.device.Battery;
import earward.block.figure.CaseName;
import earward.block.figure.FigureName;
import earward.block.figure.Quantity;
import earward.engine.CircuitPart;
import earward.engine.Seam;
import earward.kit.path.Assembly;
import earward.kit.path.PlacedBlock;
import earward.kit.path.PlacedTestPoint;
import earward.kit.review.CleanDepthLimit;
import earward.kit.review.ReviewedKit;
import earward.kit.review.SeamVerdict;

/** All figures of a kit, for programs: SI base units, peak or rms said in the key. */
final class FiguresJson {
  private static final String PATH = "path";
  private static final CaseName LISTENING = new CaseName("listening");

  private final ReviewedKit kit;
  private final Assembly assembly;
  private final PlaceNames names;

  private FiguresJson(ReviewedKit kit) {
    this.kit = kit;
    this.assembly = kit.solved().assembly();
    this.names = new PlaceNames(assembly);
  }

  static ObjectNode of(ReviewedKit kit) {
    FiguresJson json = new FiguresJson(kit);
    ObjectNode root = JsonOut.object().put("schema", "earward-figures-1");
    root.set("kit", KitHead.json(kit));
    root.put("solved", kit.solved().solved());
    root.set("conditions", ConditionsJson.of(json.assembly.design().conditions()));
    root.set("testPoints", json.testPoints());
    root.set("seams", json.seams());
    root.set("detectors", json.detectors());
    root.set("path", json.path());
    root.set("supply", json.supply());
    root.set("heatedParts", json.heatedParts());
    ObjectNode all = root.putObject("figures");
    kit.figures().all().forEach((name, value) -> JsonOut.put(all, name.toString(), value));
    root.put("doNotBuild", kit.doNotBuild());
    root.set("findings", ReviewJson.findings(kit));
    return root;
  }

  private void put(
      ObjectNode into, String key, String place, Quantity quantity, CaseName caseName) {
    JsonOut.put(into, key, kit.figures().orNaN(new FigureName(place, quantity, caseName)));
  }

  private ArrayNode testPoints() {
    ArrayNode points = JsonOut.object().arrayNode();
    for (PlacedTestPoint point : assembly.testPoints()) {
      String place = point.place();
      ObjectNode node =
          points
              .addObject()
              .put("reference", point.reference())
              .put("place", place)
              .put("node", point.node())
              .put("words", names.of(point));
      put(node, "dcVoltsNoSignal", place, Quantity.DC_VOLTS, NO_SIGNAL);
      put(node, "dcVoltsTest", place, Quantity.DC_VOLTS, TEST);
      put(node, "audioRmsVoltsTest", place, Quantity.AUDIO_RMS_VOLTS, TEST);
      put(node, "distortionFractionTest", place, Quantity.DISTORTION, TEST);
      put(node, "carrierRmsVoltsTest", place, Quantity.CARRIER_RMS_VOLTS, TEST);
      put(node, "secondHarmonicFractionTest", place, Quantity.SECOND_HARMONIC, TEST);
      put(node, "thirdHarmonicFractionTest", place, Quantity.THIRD_HARMONIC, TEST);
      put(node, "secondCarrierRmsVoltsTest", place, Quantity.SECOND_CARRIER_RMS_VOLTS, TEST);
      put(node, "thirdCarrierRmsVoltsTest", place, Quantity.THIRD_CARRIER_RMS_VOLTS, TEST);
    }
    return points;
  }

  /** The diodes that the carrier drives. */
  private ArrayNode detectors() {
    ArrayNode detectors = JsonOut.object().arrayNode();
    for (CircuitPart part : assembly.circuit().parts()) {
      String place = part.name();
      if (kit.figures().find(place, Quantity.CARRIER_PEAK_VOLTS, TEST).isPresent()) {
        ObjectNode node =
            detectors.addObject().put("place", place).put("reference", names.reference(place));
        put(node, "carrierPeakVoltsTest", place, Quantity.CARRIER_PEAK_VOLTS, TEST);
        put(node, "carrierPeakVoltsWeak", place, Quantity.CARRIER_PEAK_VOLTS, WEAK);
        put(node, "efficiencyFractionTest", place, Quantity.DETECTION_EFFICIENCY, TEST);
        put(node, "inputOhmsTest", place, Quantity.CARRIER_INPUT_OHMS, TEST);
        put(node, "loadRatioFractionTest", place, Quantity.LOAD_RATIO, TEST);
        put(node, "clippingDepthFractionTest", place, Quantity.CLIPPING_DEPTH, TEST);
        put(
            node,
            "clippingDepthFractionWithoutCapacitorTest",
            place,
            Quantity.CLIPPING_DEPTH_WITHOUT_CAPACITOR,
            TEST);
        put(
            node,
            "clippingDepthFractionWithoutCouplingTest",
            place,
            Quantity.CLIPPING_DEPTH_WITHOUT_COUPLING,
            TEST);
        put(node, "reversalDepthFractionTest", place, Quantity.REVERSAL_DEPTH, TEST);
        put(node, "cleanDepthFractionTest", place, Quantity.CLEAN_DEPTH, TEST);
        put(node, "reversePeakVoltsDeepest", place, Quantity.REVERSE_PEAK_VOLTS, DEEPEST);
      }
    }
    return detectors;
  }

  private ArrayNode seams() {
    ArrayNode seams = JsonOut.object().arrayNode();
    for (Seam seam : assembly.circuit().seams()) {
      String place = "seam." + seam.name();
      ObjectNode node =
          seams
              .addObject()
              .put("into", seam.name())
              .put("nodeBefore", seam.before())
              .put("nodeAfter", seam.after());
      put(node, "onwardOhmsTest", place, Quantity.ONWARD_OHMS, TEST);
      put(node, "backwardOhmsTest", place, Quantity.BACKWARD_OHMS, TEST);
      put(node, "loadingLossDecibelsTest", place, Quantity.LOADING_LOSS_DECIBELS, TEST);
      String level = assembly.block(seam.name()).isPresent() ? place : block(place);
      put(node, "audioRmsVoltsTest", level, Quantity.AUDIO_RMS_VOLTS, TEST);
      put(node, "dcVoltsTest", level, Quantity.DC_VOLTS, TEST);
      put(node, "carrierRmsVoltsTest", level, Quantity.CARRIER_RMS_VOLTS, TEST);
      put(node, "headroomDecibelsTest", level, Quantity.HEADROOM_DECIBELS, TEST);
      put(node, "headroomDecibelsStrong", level, Quantity.HEADROOM_DECIBELS, STRONG);
      put(node, "noiseRmsVoltsTest", level, Quantity.NOISE_RMS_VOLTS, TEST);
      overTheBand(node, place);
      put(node, "audioRmsVoltsWeak", level, Quantity.AUDIO_RMS_VOLTS, WEAK);
      put(node, "audioRmsVoltsStrong", level, Quantity.AUDIO_RMS_VOLTS, STRONG);
      put(node, "audioRmsVoltsDeepest", level, Quantity.AUDIO_RMS_VOLTS, DEEPEST);
      put(node, "dcVoltsNoSignal", level, Quantity.DC_VOLTS, NO_SIGNAL);
      Quantity distance = Quantity.SIGNAL_TO_NOISE_DECIBELS;
      put(node, "signalToNoiseDecibelsTest", level, distance, TEST);
      node.put("verdict", SeamVerdict.of(kit.solved(), seam).key());
    }
    return seams;
  }

  private void overTheBand(ObjectNode node, String place) {
    put(node, "onwardOhmsLowestTone", place, Quantity.LOWEST_TONE_ONWARD_OHMS, TEST);
    put(node, "onwardOhmsHighestTone", place, Quantity.HIGHEST_TONE_ONWARD_OHMS, TEST);
    put(node, "onwardOhmsCarrier", place, Quantity.CARRIER_ONWARD_OHMS, TEST);
    put(node, "backwardOhmsLowestTone", place, Quantity.LOWEST_TONE_BACKWARD_OHMS, TEST);
    put(node, "backwardOhmsHighestTone", place, Quantity.HIGHEST_TONE_BACKWARD_OHMS, TEST);
    put(node, "backwardOhmsCarrier", place, Quantity.CARRIER_BACKWARD_OHMS, TEST);
    Quantity low = Quantity.LOWEST_TONE_LOADING_LOSS_DECIBELS;
    Quantity high = Quantity.HIGHEST_TONE_LOADING_LOSS_DECIBELS;
    put(node, "loadingLossDecibelsLowestTone", place, low, TEST);
    put(node, "loadingLossDecibelsHighestTone", place, high, TEST);
    put(node, "loadRatioFractionWithout", place, Quantity.LOAD_RATIO_WITHOUT, TEST);
  }

  /** Both wires of a pair have the level between them. */
  private static String block(String wire) {
    return wire.substring(0, wire.lastIndexOf('.'));
  }

  private ObjectNode path() {
    ObjectNode node = JsonOut.object();
    put(node, "distortionFractionTest", PATH, Quantity.DISTORTION, TEST);
    put(node, "lowEdgeHertz", PATH, Quantity.LOW_EDGE_HERTZ, TEST);
    put(node, "highEdgeHertz", PATH, Quantity.HIGH_EDGE_HERTZ, TEST);
    put(node, "responseDeviationDecibels", PATH, Quantity.RESPONSE_DEVIATION_DECIBELS, TEST);
    put(node, "responseDeviationHertz", PATH, Quantity.RESPONSE_DEVIATION_HERTZ, TEST);
    put(node, "largestCleanDepthFraction", PATH, Quantity.CLEAN_DEPTH, TEST);
    cause(node, "largestCleanDepthCause", TEST);
    put(node, "clippingDepthFractionDeepest", PATH, Quantity.CLIPPING_DEPTH, DEEPEST);
    put(node, "outputRmsVoltsTest", PATH, Quantity.OUTPUT_RMS_VOLTS, TEST);
    put(node, "outputWattsTest", PATH, Quantity.OUTPUT_WATTS, TEST);
    put(node, "clipWatts", PATH, Quantity.CLIP_WATTS, FULL_OUTPUT);
    put(node, "tenPercentWatts", PATH, Quantity.TEN_PERCENT_WATTS, FULL_OUTPUT);
    put(node, "clipWattsBatteryLow", PATH, Quantity.CLIP_WATTS, BATTERY_LOW);
    put(node, "tenPercentWattsBatteryLow", PATH, Quantity.TEN_PERCENT_WATTS, BATTERY_LOW);
    depths(node);
    noise(node);
    put(node, "rippleRejectionDecibels", PATH, Quantity.RIPPLE_REJECTION_DECIBELS, TEST);
    put(node, "humRmsVoltsTest", PATH, Quantity.HUM_RMS_VOLTS, TEST);
    put(node, "signalToHumDecibels", PATH, Quantity.SIGNAL_TO_HUM_DECIBELS, TEST);
    put(node, "railLoopMarginDecibels", PATH, Quantity.RAIL_LOOP_MARGIN_DECIBELS, BATTERY_LOW);
    put(node, "railLoopHertz", PATH, Quantity.RAIL_LOOP_HERTZ, BATTERY_LOW);
    put(node, "soundDecibelsFullOutput", PATH, Quantity.SOUND_DECIBELS, FULL_OUTPUT);
    put(node, "soundDecibelsTest", PATH, Quantity.SOUND_DECIBELS, TEST);
    return node;
  }

  private void cause(ObjectNode node, String key, CaseName caseName) {
    CleanDepthLimit.of(kit.solved(), caseName)
        .ifPresentOrElse(limit -> node.put(key, limit.key()), () -> node.putNull(key));
  }

  /** The closed rule beside the solved depths, and the worst of the knobs' turn. */
  private void depths(ObjectNode node) {
    put(node, "powerStageDepthFraction", PATH, Quantity.POWER_STAGE_DEPTH, TEST);
    put(node, "reversalDepthFraction", PATH, Quantity.REVERSAL_DEPTH, TEST);
    put(node, "clippingDepthFractionTest", PATH, Quantity.CLIPPING_DEPTH, TEST);
    put(node, "largestCleanDepthFractionWorstTurn", PATH, Quantity.CLEAN_DEPTH, WORST_TURN);
    boolean turned =
        kit.figures().all().keySet().stream()
            .anyMatch(
                name ->
                    name.quantity() == Quantity.KNOB_POSITION
                        && name.caseName().equals(WORST_TURN));
    cause(node, "largestCleanDepthCauseWorstTurn", turned ? WORST_TURN : TEST);
    put(node, "reversalDepthFractionWorstTurn", PATH, Quantity.REVERSAL_DEPTH, WORST_TURN);
    ArrayNode knobs = node.putArray("worstTurnKnobs");
    for (CircuitPart part : assembly.circuit().parts()) {
      kit.figures()
          .find(part.name(), Quantity.KNOB_POSITION, WORST_TURN)
          .ifPresent(
              position ->
                  knobs
                      .addObject()
                      .put("place", part.name())
                      .put("reference", names.reference(part.name()))
                      .put("positionFraction", position));
    }
  }

  private void noise(ObjectNode node) {
    put(node, "signalToNoiseDecibels", PATH, Quantity.SIGNAL_TO_NOISE_DECIBELS, TEST);
    Quantity weighted = Quantity.A_WEIGHTED_SIGNAL_TO_NOISE_DECIBELS;
    put(node, "aWeightedSignalToNoiseDecibels", PATH, weighted, TEST);
    put(node, "signalToNoiseDecibelsWeak", PATH, Quantity.SIGNAL_TO_NOISE_DECIBELS, WEAK);
    put(node, "noiseRmsVoltsTest", PATH, Quantity.NOISE_RMS_VOLTS, TEST);
    put(node, "noiseRmsVoltsNoSignal", PATH, Quantity.NOISE_RMS_VOLTS, NO_SIGNAL);
    Quantity hiss = Quantity.A_WEIGHTED_NOISE_RMS_VOLTS;
    put(node, "aWeightedNoiseRmsVoltsNoSignal", PATH, hiss, NO_SIGNAL);
    String detector =
        assembly.path().stream()
            .filter(block -> block.type().role() == Role.DETECTOR)
            .map(PlacedBlock::id)
            .findFirst()
            .orElse("");
    Quantity there = Quantity.SIGNAL_TO_NOISE_DECIBELS;
    put(node, "signalToNoiseDecibelsDetector", detector, there, TEST);
  }

  private ObjectNode supply() {
    ObjectNode node = JsonOut.object();
    put(node, "amperesNoSignal", PATH, Quantity.SUPPLY_AMPERES, NO_SIGNAL);
    put(node, "amperesTest", PATH, Quantity.SUPPLY_AMPERES, TEST);
    put(node, "amperesFullOutput", PATH, Quantity.SUPPLY_AMPERES, FULL_OUTPUT);
    ArrayNode batteries = node.putArray("batteries");
    for (CircuitPart part : assembly.circuit().parts()) {
      if (part.device() instanceof Battery) {
        ObjectNode battery =
            batteries
                .addObject()
                .put("place", part.name())
                .put("reference", names.reference(part.name()));
        put(battery, "hoursNoSignal", part.name(), Quantity.BATTERY_HOURS, NO_SIGNAL);
        put(battery, "hoursTest", part.name(), Quantity.BATTERY_HOURS, TEST);
        put(battery, "hoursListening", part.name(), Quantity.BATTERY_HOURS, LISTENING);
        put(battery, "hoursFullVolume", part.name(), Quantity.BATTERY_HOURS, FULL_VOLUME);
        put(battery, "hoursFullOutput", part.name(), Quantity.BATTERY_HOURS, FULL_OUTPUT);
      }
    }
    return node;
  }

  private ArrayNode heatedParts() {
    ArrayNode parts = JsonOut.object().arrayNode();
    for (CircuitPart part : assembly.circuit().parts()) {
      String place = part.name();
      if (kit.figures().find(place, Quantity.JUNCTION_CELSIUS, HOTTEST).isPresent()) {
        ObjectNode node =
            parts.addObject().put("place", place).put("reference", names.reference(place));
        put(node, "dissipationWattsNoSignal", place, Quantity.DISSIPATION_WATTS, NO_SIGNAL);
        put(node, "dissipationWattsTest", place, Quantity.DISSIPATION_WATTS, TEST);
        put(node, "dissipationWattsHottest", place, Quantity.DISSIPATION_WATTS, HOTTEST);
        put(node, "junctionCelsiusHottest", place, Quantity.JUNCTION_CELSIUS, HOTTEST);
        put(node, "surfaceCelsiusHottest", place, Quantity.SURFACE_CELSIUS, HOTTEST);
      }
    }
    return parts;
  }
}
