package earward.engine.waveform;

import earward.engine.law.WaveformDevice;
import earward.engine.law.WaveformStage;
import earward.engine.law.WaveformTerm;
import earward.engine.law.WaveformTerm.Kind;
import java.util.List;

/**
 * The equations of a circuit over time:
 *
 * <pre>A·x + R·ds/dt + S·s + B·w + c + d·e(t) = 0,  w = f(U·x + V·s + k)</pre>
 *
 * <p>with unknowns x, states s, outputs w of devices and kinks, and the drive e. Columns of one
 * dense matrix in this order: x, rates, states, w, one, drive. Immutable; arrays are not to be
 * written.
 */
final class WaveformCircuit {
  final int unknowns;
  final int states;
  final int deviceControls;
  final int deviceOutputs;
  final int kinks;
  final WaveformDevice[] devices;
  final double[] starts;

  /** Unknowns and rates: the rows, and what is solved for at one instant. */
  final int size;

  final int columns;

  /** Rows of the equations. */
  final double[][] rows;

  /** Rows of the controls, devices' first. */
  final double[][] controls;

  /** What the drive is multiplied by to give the feed's power, in A. */
  final double[] power;

  WaveformCircuit(WaveformStage stage) {
    unknowns = stage.unknowns();
    starts = stage.starts();
    states = starts.length;
    size = unknowns + states;
    List<WaveformDevice> all = stage.devices();
    devices = all.toArray(WaveformDevice[]::new);
    deviceControls = all.stream().mapToInt(WaveformDevice::controls).sum();
    deviceOutputs = all.stream().mapToInt(WaveformDevice::outputs).sum();
    kinks = stage.kinks();
    columns = size + states + outputs() + 2;
    rows = new double[size][columns];
    stage.terms().forEach(term -> rows[term.row()][column(term)] += term.factor());
    controls = new double[deviceControls + kinks][columns];
    stage.deviceControls().forEach(t -> controls[t.row()][column(t)] += t.factor());
    stage.kinkControls().forEach(t -> controls[deviceControls + t.row()][column(t)] += t.factor());
    power = new double[columns];
    stage.power().forEach(term -> power[column(term)] += term.factor());
  }

  int outputs() {
    return deviceOutputs + kinks;
  }

  int firstState() {
    return size;
  }

  int firstOutput() {
    return size + states;
  }

  int one() {
    return columns - 2;
  }

  int drive() {
    return columns - 1;
  }

  private int column(WaveformTerm term) {
    Kind kind = term.kind();
    return switch (kind) {
      case UNKNOWN -> term.index();
      case RATE -> unknowns + term.index();
      case STATE -> firstState() + term.index();
      case DEVICE -> firstOutput() + term.index();
      case KINK -> firstOutput() + deviceOutputs + term.index();
      case CONSTANT -> one();
      case DRIVE -> drive();
    };
  }
}
