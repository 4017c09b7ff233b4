package earward.engine.internal;

import earward.engine.detection.CarrierSurroundings;
import earward.engine.detection.EnvelopeSolver;
import earward.engine.detection.PortLaw;
import earward.engine.law.CarrierDriven;
import earward.engine.law.DirectStage;
import earward.engine.linear.RealLu;
import java.util.Arrays;

/** The carrier-driven devices of one case: their surroundings and both of their solvers. */
final class Detection {
  /**
   * Samples where the carrier alone is solved: cheap, and pulses as narrow as those of 150 thermal
   * voltages are still met by two samples.
   */
  private static final int LONE_CARRIER_SAMPLES = 64;

  /** Impedance at DC above which a port has no load but what leaks. */
  private static final double FLOATING_OHMS = 1e9;

  /** Share of its largest entry by which a row of surroundings may differ and yet be the same. */
  private static final double UNMOVED = 1e-12;

  private final Network network;
  private final RealLu conductances;
  private final double[] means;
  final EnvelopeSolver modulated;
  final EnvelopeSolver carrierOnly;
  final CarrierSurroundings around;
  private final CarrierSurroundings solved;
  private final CarrierSurroundings spare;
  private double keptDetuning;
  private final PortLaw[] devices;
  private final CarrierDriven[] parts;

  Detection(Network network, DirectStage stage, Fineness fineness) {
    this.network = network;
    int ports = network.ports.length;
    conductances = new RealLu(ports);
    means = new double[ports];
    modulated =
        new EnvelopeSolver(ports, fineness.carrierSamples(), fineness.audioSamples(), false);
    carrierOnly =
        new EnvelopeSolver(
            ports, Math.max(LONE_CARRIER_SAMPLES, fineness.carrierSamples()), 2, true);
    around =
        new CarrierSurroundings(ports, carrierOnly.carrierHarmonics(), modulated.audioHarmonics());
    solved =
        new CarrierSurroundings(ports, carrierOnly.carrierHarmonics(), modulated.audioHarmonics());
    spare = new CarrierSurroundings(ports, CarrierTable.SHOWN, 1);
    parts =
        Arrays.stream(network.ports)
            .filter(port -> port.which() == 0)
            .map(Port::law)
            .toArray(CarrierDriven[]::new);
    devices = Arrays.stream(parts).map(part -> part.portLaw(stage)).toArray(PortLaw[]::new);
  }

  void keep() {
    keptDetuning = around.detuningRadians;
    modulated.keep();
    carrierOnly.keep();
  }

  /** The next solves start from nothing. */
  void forget() {
    around.detuningRadians = 0;
    modulated.forget();
    carrierOnly.forget();
  }

  void recall() {
    around.detuningRadians = keptDetuning;
    modulated.recall();
    carrierOnly.recall();
  }

  /** Takes over DC: Thévenin's equivalent at each port about the present point. */
  void direct(DirectSolver direct, double[] scratch) {
    DirectStage stage = direct.stage();
    for (int k = 0; k < parts.length; k++) {
      parts[k].fill(stage, devices[k]);
    }
    for (int i = 0; i < network.ports.length; i++) {
      around.seriesOhms[i] = network.ports[i].seriesOhms(stage);
      int anode = network.ports[i].anode(stage);
      int cathode = network.ports[i].cathode(stage);
      around.openVolts[i] = stage.volts(anode) - stage.volts(cathode);
    }
    for (int j = 0; j < network.ports.length; j++) {
      Port from = network.ports[j];
      direct.push(from.anode(stage), from.cathode(stage), scratch);
      for (int i = 0; i < network.ports.length; i++) {
        int anode = network.ports[i].anode(stage);
        int cathode = network.ports[i].cathode(stage);
        double ohms = (cathode < 0 ? 0 : scratch[cathode]) - (anode < 0 ? 0 : scratch[anode]);
        around.audioRealOhms[around.index(0, i, j)] = ohms;
        around.audioImaginaryOhms[around.index(0, i, j)] = 0;
        around.openVolts[i] += ohms * stage.drivenAmperes()[j];
      }
    }
  }

  /**
   * Writes the mean currents. Between floating capacitors a mean is the small difference of large
   * ones, and the voltage there hangs on it: then the means are taken from the solved voltages,
   * which are sure, by the conductances at DC.
   */
  void means(double[] amperes) {
    int ports = network.ports.length;
    double most = 0;
    for (int i = 0; i < ports; i++) {
      amperes[i] = modulated.audioReal[i];
      most = Math.max(most, Math.abs(around.audioRealOhms[around.index(0, i, i)]));
    }
    if (most < FLOATING_OHMS) {
      return;
    }
    conductances.clear();
    for (int i = 0; i < ports; i++) {
      means[i] = around.openVolts[i] - modulated.meanVolts(i) - around.seriesOhms[i] * amperes[i];
      for (int j = 0; j < ports; j++) {
        conductances.add(i, j, around.audioRealOhms[around.index(0, i, j)]);
      }
    }
    if (conductances.factor()) {
      conductances.solve(means);
      System.arraycopy(means, 0, amperes, 0, ports);
    }
  }

  /** Takes over the audio impedances. */
  void audio(AudioTable table, DirectStage stage) {
    for (int h = 1; h <= around.audioHarmonics(); h++) {
      for (int i = 0; i < network.ports.length; i++) {
        int anode = network.ports[i].anode(stage);
        int cathode = network.ports[i].cathode(stage);
        for (int j = 0; j < network.ports.length; j++) {
          int entry = around.index(h, i, j);
          around.audioRealOhms[entry] = table.re(h, j, cathode) - table.re(h, j, anode);
          around.audioImaginaryOhms[entry] = table.im(h, j, cathode) - table.im(h, j, anode);
        }
      }
    }
  }

  /** Whether the surroundings are those of the last modulated solve, but for rounding. */
  boolean unmoved() {
    return around.near(solved, UNMOVED);
  }

  /** Surroundings that nothing is solved in; they take what is filled on the way. */
  CarrierSurroundings spare() {
    return spare;
  }

  boolean solveModulated(double peakVolts, double depth, double toneRadians) {
    solved.copy(around);
    return modulated.solve(around, devices, peakVolts, depth, toneRadians);
  }

  boolean solveCarrier(double peakVolts) {
    return carrierOnly.solve(around, devices, peakVolts, 0, 0);
  }

  /**
   * Tunes as a builder does, for most detector DC: turns the winding's core until it is in phase
   * with what drives it, the devices and their capacitances in place.
   *
   * @param coarseness how many times rounding's own error a start near by may leave; 1 for none
   * @return ωc − ω0 at the peak, in rad/s; NaN where nothing converged
   */
  double peak(double peakVolts, double coarseness) {
    around.peaking = true;
    carrierOnly.coarser(coarseness);
    boolean solved = solveCarrier(peakVolts);
    carrierOnly.coarser(1);
    around.peaking = false;
    return solved
        ? -carrierOnly.drawnImaginary(0) / (2 * around.tankFarads * carrierOnly.feedReal[0])
        : Double.NaN;
  }
}
