package earward.engine.internal;

import earward.block.figure.FigureName;
import earward.block.figure.Quantity;
import earward.engine.Probe;
import earward.engine.Seam;
import earward.engine.law.AmplifierLaw;
import earward.engine.law.CarrierDriven;
import earward.engine.law.DiodeLaw;
import earward.engine.law.Heated;
import earward.engine.law.Law;
import earward.engine.law.SourceLaw;
import java.util.List;

/** Finds how a figure is read: the one place that knows which quantity exists where. */
final class Readings {
  private static final Reading NONE = work -> Double.NaN;
  private static final String SEAM = "seam.";

  private final Network network;

  Readings(Network network) {
    this.network = network;
  }

  /**
   * How a figure is read; for one that the place cannot have, a reading that gives NaN.
   *
   * @throws IllegalArgumentException with one sentence when there is no such place
   */
  Reading of(FigureName name, CasePlan plan) {
    Quantity quantity = name.quantity();
    return switch (quantity) {
      case NOISE_RMS_VOLTS, A_WEIGHTED_NOISE_RMS_VOLTS -> noise(name, plan);
      case DC_VOLTS,
          AUDIO_RMS_VOLTS,
          DISTORTION,
          SECOND_HARMONIC,
          THIRD_HARMONIC,
          CARRIER_RMS_VOLTS,
          SECOND_CARRIER_RMS_VOLTS,
          THIRD_CARRIER_RMS_VOLTS,
          LOW_EDGE_HERTZ,
          HIGH_EDGE_HERTZ,
          RESPONSE_DEVIATION_DECIBELS,
          RESPONSE_DEVIATION_HERTZ ->
          atNodes(name);
      case ONWARD_OHMS,
          BACKWARD_OHMS,
          LOADING_LOSS_DECIBELS,
          LOWEST_TONE_ONWARD_OHMS,
          HIGHEST_TONE_ONWARD_OHMS,
          LOWEST_TONE_BACKWARD_OHMS,
          HIGHEST_TONE_BACKWARD_OHMS,
          LOWEST_TONE_LOADING_LOSS_DECIBELS,
          HIGHEST_TONE_LOADING_LOSS_DECIBELS,
          CARRIER_ONWARD_OHMS,
          CARRIER_BACKWARD_OHMS,
          LOAD_RATIO_WITHOUT ->
          atSeam(name);
      case HEADROOM_DECIBELS,
          OUTPUT_RMS_VOLTS,
          OUTPUT_WATTS,
          SIGNAL_TO_NOISE_DECIBELS,
          A_WEIGHTED_SIGNAL_TO_NOISE_DECIBELS,
          BATTERY_HOURS,
          SOUND_DECIBELS,
          SIGNAL_TO_HUM_DECIBELS,
          POWER_STAGE_DEPTH,
          KNOB_POSITION ->
          NONE;
      default -> ofPart(quantity, part(name.place()));
    };
  }

  private Law part(String place) {
    Law law = network.lawOf.get(place);
    if (law == null) {
      throw new IllegalArgumentException("there is no part '" + place + "' in the circuit");
    }
    return law;
  }

  private Reading atNodes(FigureName name) {
    int[] place = place(name);
    return between(name.quantity(), place[0], place[1]);
  }

  private Reading noise(FigureName name, CasePlan plan) {
    int[] nodes = place(name);
    int place = plan.addNoise(nodes[0], nodes[1]);
    boolean byCurveA = name.quantity() == Quantity.A_WEIGHTED_NOISE_RMS_VOLTS;
    return work -> work.noise.rmsVolts(work, place, byCurveA);
  }

  /** The two nodes of a place, −1 for ground. */
  private int[] place(FigureName name) {
    for (Probe probe : network.circuit.probes()) {
      if (probe.name().equals(name.place())) {
        return new int[] {network.node(probe.plus()), network.node(probe.minus())};
      }
    }
    if (!network.hasNode(name.place())) {
      throw new IllegalArgumentException(
          "there is no node or probe '" + name.place() + "' in the circuit");
    }
    return new int[] {network.node(name.place()), -1};
  }

  private static Reading between(Quantity quantity, int plus, int minus) {
    return switch (quantity) {
      case DC_VOLTS ->
          work -> work.solved() ? work.stage().volts(plus) - work.stage().volts(minus) : Double.NaN;
      case AUDIO_RMS_VOLTS ->
          work -> work.solved() ? work.signal.peak(1, plus, minus) / Math.sqrt(2) : Double.NaN;
      case DISTORTION -> work -> work.solved() ? work.signal.distortion(plus, minus) : Double.NaN;
      case SECOND_HARMONIC ->
          work -> work.solved() ? work.signal.share(2, plus, minus) : Double.NaN;
      case THIRD_HARMONIC -> work -> work.solved() ? work.signal.share(3, plus, minus) : Double.NaN;
      case CARRIER_RMS_VOLTS -> work -> CarrierLevels.rmsVolts(work, 1, plus, minus);
      case SECOND_CARRIER_RMS_VOLTS -> work -> CarrierLevels.rmsVolts(work, 2, plus, minus);
      case THIRD_CARRIER_RMS_VOLTS -> work -> CarrierLevels.rmsVolts(work, 3, plus, minus);
      case LOW_EDGE_HERTZ -> work -> SmallResponse.edge(work, plus, minus, false);
      case HIGH_EDGE_HERTZ -> work -> SmallResponse.edge(work, plus, minus, true);
      case RESPONSE_DEVIATION_DECIBELS -> work -> SmallResponse.deviation(work, plus, minus, false);
      case RESPONSE_DEVIATION_HERTZ -> work -> SmallResponse.deviation(work, plus, minus, true);
      default -> NONE;
    };
  }

  private Reading atSeam(FigureName name) {
    List<Seam> seams = network.circuit.seams();
    for (int i = 0; i < seams.size(); i++) {
      if (name.place().equals(SEAM + seams.get(i).name())) {
        int seam = i;
        int partner = partner(seams, seams.get(i).name());
        return name.quantity() == Quantity.LOAD_RATIO_WITHOUT
            ? work -> LoadRatio.cut(work, seam, partner)
            : seamView(name.quantity(), seam, partner);
      }
    }
    throw new IllegalArgumentException("there is no seam '" + name.place() + "' in the circuit");
  }

  private static Reading seamView(Quantity quantity, int seam, int partner) {
    SeamView.Side side =
        switch (quantity) {
          case ONWARD_OHMS,
              LOWEST_TONE_ONWARD_OHMS,
              HIGHEST_TONE_ONWARD_OHMS,
              CARRIER_ONWARD_OHMS ->
              SeamView.Side.ONWARD;
          case BACKWARD_OHMS,
              LOWEST_TONE_BACKWARD_OHMS,
              HIGHEST_TONE_BACKWARD_OHMS,
              CARRIER_BACKWARD_OHMS ->
              SeamView.Side.BACKWARD;
          default -> SeamView.Side.LOSS;
        };
    SeamView.At at =
        switch (quantity) {
          case LOWEST_TONE_ONWARD_OHMS,
              LOWEST_TONE_BACKWARD_OHMS,
              LOWEST_TONE_LOADING_LOSS_DECIBELS ->
              SeamView.At.LOWEST_TONE;
          case HIGHEST_TONE_ONWARD_OHMS,
              HIGHEST_TONE_BACKWARD_OHMS,
              HIGHEST_TONE_LOADING_LOSS_DECIBELS ->
              SeamView.At.HIGHEST_TONE;
          case CARRIER_ONWARD_OHMS, CARRIER_BACKWARD_OHMS -> SeamView.At.CARRIER;
          default -> SeamView.At.OWN_TONE;
        };
    return work -> SeamView.of(work, seam, partner, side, at);
  }

  /** The way back of a pair's seam, −1 for a single wire. */
  private static int partner(List<Seam> seams, String name) {
    int dot = name.lastIndexOf('.');
    if (dot < 0) {
      return -1;
    }
    String other = name.endsWith(".minus") ? ".plus" : ".minus";
    for (int i = 0; i < seams.size(); i++) {
      if (seams.get(i).name().equals(name.substring(0, dot) + other)) {
        return i;
      }
    }
    return -1;
  }

  private Reading ofPart(Quantity quantity, Law law) {
    if (law instanceof AmplifierLaw amplifier) {
      return ofAmplifier(quantity, amplifier);
    }
    if (law instanceof CarrierDriven driven && driven.driven() >= 0) {
      return ofDriven(quantity, driven, law);
    }
    if (law instanceof SourceLaw source) {
      return ofSource(quantity, source);
    }
    return ofAny(quantity, law);
  }

  private static Reading ofSource(Quantity quantity, SourceLaw source) {
    return switch (quantity) {
      case RIPPLE_REJECTION_DECIBELS ->
          work -> RailView.of(work, source, RailView.Asked.REJECTION_DECIBELS);
      case HUM_RMS_VOLTS -> work -> RailView.of(work, source, RailView.Asked.HUM_RMS_VOLTS);
      case RAIL_LOOP_MARGIN_DECIBELS ->
          work -> RailView.of(work, source, RailView.Asked.MARGIN_DECIBELS);
      case RAIL_LOOP_HERTZ -> work -> RailView.of(work, source, RailView.Asked.MARGIN_HERTZ);
      default -> ofAny(quantity, source);
    };
  }

  private static Reading ofAny(Quantity quantity, Law law) {
    return switch (quantity) {
      case DC_AMPERES, SUPPLY_AMPERES ->
          work -> work.solved() ? law.amperes(work.stage()) : Double.NaN;
      case DROP_VOLTS -> work -> work.solved() ? law.dropVolts(work.stage()) : Double.NaN;
      case DISSIPATION_WATTS -> work -> work.solved() ? law.watts(work.stage()) : Double.NaN;
      case JUNCTION_CELSIUS ->
          law instanceof Heated heated
              ? work ->
                  work.solved()
                      ? work.stage().celsius()
                          + law.watts(work.stage()) * heated.junctionToAirKelvinPerWatt()
                      : Double.NaN
              : NONE;
      case REVERSE_PEAK_VOLTS ->
          law instanceof DiodeLaw diode
              ? work ->
                  work.solved()
                      ? Math.max(
                          0,
                          work.stage().volts(diode.cathode(work.stage()))
                              - work.stage().volts(diode.anode(work.stage())))
                      : Double.NaN
              : NONE;
      default -> NONE;
    };
  }

  private Reading ofDriven(Quantity quantity, CarrierDriven part, Law law) {
    int port = part.driven();
    return switch (quantity) {
      case REVERSE_PEAK_VOLTS ->
          work ->
              work.detection != null && work.solved()
                  ? work.detection.modulated.reversePeakVolts[port]
                  : Double.NaN;
      case DISSIPATION_WATTS ->
          work ->
              work.plan.drive == earward.engine.Drive.SIGNAL
                  ? CarrierLevels.heatWatts(work, port)
                  : work.solved() ? law.watts(work.stage()) : Double.NaN;
      case CARRIER_PEAK_VOLTS -> work -> CarrierLevels.portPeakVolts(work, port);
      case DETECTION_EFFICIENCY -> work -> CarrierLevels.efficiency(work, port);
      case CARRIER_INPUT_OHMS -> work -> CarrierLevels.inputOhms(work, port);
      case LOAD_RATIO -> work -> LoadRatio.of(work, port);
      case CLIPPING_DEPTH -> work -> work.clipping.depth(port, ClippingRule.Without.NOTHING);
      case CLIPPING_DEPTH_WITHOUT_CAPACITOR ->
          work -> work.clipping.depth(port, ClippingRule.Without.CAPACITOR);
      case CLIPPING_DEPTH_WITHOUT_COUPLING ->
          work -> work.clipping.depth(port, ClippingRule.Without.COUPLING);
      case REVERSAL_DEPTH -> work -> work.depths.reversal(port);
      case CLEAN_DEPTH -> work -> work.depths.clean(endPlus(work, part), endMinus(work, part));
      default -> ofAny(quantity, law);
    };
  }

  /** Distortion is judged at the end of the path, or across the diode where no end is named. */
  private int endPlus(CaseWork work, CarrierDriven part) {
    for (int i = 0; i < network.probePlus.length; i++) {
      if (network.circuit.probes().get(i).name().equals("path")) {
        return network.probePlus[i];
      }
    }
    return part.cathode(work.stage(), 0);
  }

  private int endMinus(CaseWork work, CarrierDriven part) {
    for (int i = 0; i < network.probeMinus.length; i++) {
      if (network.circuit.probes().get(i).name().equals("path")) {
        return network.probeMinus[i];
      }
    }
    return part.anode(work.stage(), 0);
  }

  private static Reading ofAmplifier(Quantity quantity, AmplifierLaw amplifier) {
    int a = amplifier.ordinal();
    return switch (quantity) {
      case SUPPLY_VOLTS -> work -> work.solved() ? amplifier.supplyVolts(work.stage()) : Double.NaN;
      case DISSIPATION_WATTS -> work -> work.solved() ? work.outputs.heatWatts[a] : Double.NaN;
      case JUNCTION_CELSIUS ->
          work ->
              work.solved()
                  ? work.stage().celsius()
                      + work.outputs.heatWatts[a] * amplifier.junctionToAir(work.stage())
                  : Double.NaN;
      case SURFACE_CELSIUS ->
          work ->
              work.solved()
                  ? work.stage().celsius()
                      + work.outputs.heatWatts[a] * amplifier.surfaceToAir(work.stage())
                  : Double.NaN;
      case CLIP_WATTS -> work -> clipping(work) ? work.outputs.clipWatts[a] : Double.NaN;
      case TEN_PERCENT_WATTS ->
          work -> clipping(work) ? work.outputs.tenPercentWatts[a] : Double.NaN;
      case PEAK_AMPERES -> work -> work.solved() ? work.outputs.peakAmperes[a] : Double.NaN;
      case OVERLOAD_DECIBELS ->
          work ->
              work.plan.drive == earward.engine.Drive.SIGNAL && work.solved()
                  ? work.outputs.overloadDecibels[a]
                  : Double.NaN;
      default -> ofAny(quantity, amplifier);
    };
  }

  private static boolean clipping(CaseWork work) {
    return work.plan.drive == earward.engine.Drive.CLIPPING && work.solved();
  }
}
