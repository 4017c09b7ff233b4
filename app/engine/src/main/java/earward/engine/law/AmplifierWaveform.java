package earward.engine.law;

import earward.block.device.ControlPoint;
import earward.block.device.OutputSwing;
import earward.block.device.Terminal;
import java.util.List;

/**
 * An audio amplifier IC over time: what {@link AmplifierLaw} says at DC and at audio, in one set of
 * equations. Rest voltages and the input's offset follow slow means, so that each output rests
 * where it does at DC; the signal has its pole, and its output stops at the lost voltages, which
 * grow with the current of the instant.
 */
final class AmplifierWaveform {
  /** Time constant of the slow means: far below the audio band. */
  private static final double SLOW_SECONDS = 100;

  private final AmplifierLaw law;
  private final WaveformStage stage;
  private final DirectStage point;
  private final int[] nodes;
  private final int supply;
  private final int ground;
  private final double on;
  private final int supplyMean;
  private final int referenceMean;

  AmplifierWaveform(AmplifierLaw law, WaveformStage stage, int[] nodes) {
    this.law = law;
    this.stage = stage;
    this.nodes = nodes;
    point = stage.point();
    supply = law.at(nodes, Terminal.SUPPLY);
    ground = law.at(nodes, Terminal.GROUND);
    on = law.on(law.supplyVolts(point));
    supplyMean = mean(supply, ground);
    referenceMean =
        law.has(Terminal.RIPPLE) ? mean(law.at(nodes, Terminal.RIPPLE), ground) : supplyMean;
  }

  /** A state that follows the slow mean of a voltage. */
  private int mean(int plus, int minus) {
    int state = stage.state(stage.startVolts(plus, minus));
    int row = stage.rowOf(state);
    stage.rate(row, state, SLOW_SECONDS);
    stage.stateTerm(row, state, 1);
    stage.term(row, plus, -1);
    stage.term(row, minus, 1);
    return state;
  }

  void stamp() {
    stage.current(supply, ground, on * law.value(point, AmplifierLaw.QUIESCENT));
    int input = law.at(nodes, Terminal.INPUT);
    stage.conductance(input, ground, 1 / law.value(point, AmplifierLaw.INPUT_OHMS));
    stage.current(ground, input, on * law.value(point, AmplifierLaw.BIAS));
    insidePins();
    boolean outside = law.model().gain().setFromOutside();
    int filtered = outside ? filtered(input, ground, false) : controlled(fixedInput(input));
    for (int k = 0; k < law.branches(); k++) {
      int deviation = stage.unknown();
      stage.term(deviation, deviation, 1);
      if (outside) {
        feedback(deviation, filtered);
      } else if (!stage.quiet()) {
        stage.term(deviation, filtered, -fixedGain(k));
      }
      if (!stage.quiet()) {
        ripple(deviation, outside, k);
      }
      output(k, deviation);
    }
  }

  private void insidePins() {
    double inputSiemens = 1 / law.value(point, AmplifierLaw.INPUT_OHMS);
    join(Terminal.RIPPLE, supply, AmplifierLaw.RIPPLE_SIEMENS);
    join(Terminal.BOOTSTRAP, supply, AmplifierLaw.BOOTSTRAP_SIEMENS);
    join(Terminal.INVERTING, ground, inputSiemens);
    join(Terminal.INVERTING_TWO, ground, inputSiemens);
    if (law.model().gain().setFromOutside()) {
      join(
          Terminal.GAIN,
          law.at(nodes, Terminal.OUTPUT),
          1 / law.value(point, AmplifierLaw.FEEDBACK_OHMS));
    }
  }

  private void join(Terminal pin, int to, double siemens) {
    if (law.has(pin)) {
      stage.conductance(law.at(nodes, pin), to, siemens);
    }
  }

  private int fixedInput(int input) {
    boolean inverting = law.has(Terminal.INVERTING);
    return filtered(input, inverting ? law.at(nodes, Terminal.INVERTING) : ground, true);
  }

  /** An unknown that is a voltage behind the IC's one pole, with or without its slow mean. */
  private int filtered(int plus, int minus, boolean withoutMean) {
    int unknown = stage.unknown();
    double seconds = 1 / (2 * Math.PI * law.edgeHertz(point));
    int row = unknown;
    if (seconds > 0) {
      int state = stage.state(withoutMean ? 0 : stage.startVolts(plus, minus));
      stage.term(unknown, unknown, 1);
      stage.stateTerm(unknown, state, -1);
      row = stage.rowOf(state);
      stage.rate(row, state, seconds);
      stage.stateTerm(row, state, 1);
    } else {
      stage.term(row, unknown, 1);
    }
    stage.term(row, plus, -1);
    stage.term(row, minus, 1);
    if (withoutMean) {
      stage.stateTerm(row, mean(plus, minus), 1);
    }
    return unknown;
  }

  private double fixedGain(int k) {
    double share = law.model().bridge() ? 0.5 : 1;
    double sign = k == 0 ? 1 : -1;
    return on * sign * share * law.value(point, AmplifierLaw.GAIN);
  }

  /** What the control pin leaves of a signal; the signal itself where there is no such pin. */
  private int controlled(int signal) {
    List<ControlPoint> curve = law.model().gain().control();
    if (!law.has(Terminal.CONTROL) || curve.isEmpty()) {
      return signal;
    }
    int left = stage.unknown();
    stage.term(left, left, 1);
    stage
        .device(new ControlledSignal(curve))
        .control(0, signal, 1)
        .control(1, law.at(nodes, Terminal.CONTROL), 1)
        .control(1, ground, -1)
        .output(0, left, -1);
    return left;
  }

  /** Open-loop gain times input less GAIN; an offset that follows the output keeps it at rest. */
  private void feedback(int deviation, int filtered) {
    double gain = on * law.model().gain().openLoopGain();
    int pin = law.at(nodes, Terminal.GAIN);
    int offset =
        stage.state(
            stage.startVolts(law.at(nodes, Terminal.INPUT), ground)
                - stage.startVolts(pin, ground));
    int row = stage.rowOf(offset);
    stage.rate(row, offset, SLOW_SECONDS);
    if (stage.quiet()) {
      stage.stateTerm(row, offset, 1);
      stage.term(row, filtered, -1);
      stage.term(row, pin, 1);
      stage.term(row, ground, -1);
      return;
    }
    stage.term(deviation, filtered, -gain);
    stage.term(deviation, pin, gain);
    stage.term(deviation, ground, -gain);
    stage.stateTerm(deviation, offset, gain);
    stage.term(row, law.at(nodes, Terminal.OUTPUT), -1);
    stage.term(row, ground, 1);
    rest(row, 1);
  }

  /** Adds the rest voltage of an output, times a factor, to a row. */
  private void rest(int row, double factor) {
    stage.stateTerm(row, referenceMean, factor * law.value(point, AmplifierLaw.REST_FRACTION));
    stage.constant(row, factor * on * law.model().restVolts());
  }

  /** As it is heard: across a bridge's load, half of it at either end. */
  private void ripple(int deviation, boolean outside, int k) {
    double share = law.model().bridge() ? 0.5 : 1;
    double scale =
        outside
            ? on * law.model().gain().openLoopGain() / law.model().gain().fixedGain()
            : on * share * (k == 0 ? 1 : -1);
    double held = scale * Math.pow(10, -law.model().rippleRejectionDecibels() / 20);
    double bare = scale * Math.pow(10, -law.model().rippleRejectionBareDecibels() / 20);
    boolean has = law.has(Terminal.RIPPLE);
    above(deviation, supply, supplyMean, has ? -held : -bare);
    if (has) {
      above(deviation, law.at(nodes, Terminal.RIPPLE), referenceMean, held - bare);
    }
  }

  /** Adds factor times what a node stands above its slow mean. */
  private void above(int row, int node, int mean, double factor) {
    stage.term(row, node, factor);
    stage.term(row, ground, -factor);
    stage.stateTerm(row, mean, -factor);
  }

  private void output(int k, int deviation) {
    int branch = law.outputBranch(k);
    int node = law.at(nodes, k == 0 ? Terminal.OUTPUT : Terminal.OUTPUT_TWO);
    stage.branchCurrent(branch, ground, node);
    stage.term(branch, node, 1);
    stage.term(branch, branch, AmplifierLaw.OUTPUT_OHMS);
    stage.term(branch, ground, -1);
    stage.term(branch, deviation, -1);
    rest(branch, -1);
    if (!stage.quiet()) {
      stage.kink().control(0, branch, 1).current(0, supply, ground, 1);
      limits(branch, deviation);
    }
  }

  private void limits(int branch, int deviation) {
    double fraction = law.value(point, AmplifierLaw.REST_FRACTION);
    double restVolts = on * law.model().restVolts();
    OutputSwing swing = law.model().swing();
    double lostUp =
        swing.lostUpVolts() + (law.bootstrapped(point) ? 0 : swing.lostWithoutBootstrapVolts());
    stage
        .kink()
        .control(0, deviation, 1)
        .control(0, supply, -1)
        .control(0, ground, 1)
        .controlState(0, referenceMean, fraction)
        .controlConstant(0, restVolts + lostUp)
        .control(0, branch, swing.lostUpOhms())
        .output(0, branch, 1);
    stage
        .kink()
        .control(0, deviation, -1)
        .controlState(0, referenceMean, -fraction)
        .controlConstant(0, swing.lostDownVolts() - restVolts)
        .control(0, branch, -swing.lostDownOhms())
        .output(0, branch, -1);
  }
}
