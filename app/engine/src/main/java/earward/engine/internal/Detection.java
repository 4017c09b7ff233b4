package earward.engine.internal;

import earward.engine.detection.CarrierSurroundings;
import earward.engine.detection.EnvelopeSolver;
import earward.engine.detection.JunctionLaw;
import earward.engine.law.DirectStage;

/** The carrier-driven devices of one case: their surroundings and both of their solvers. */
final class Detection {
  /** Samples of a carrier cycle and of an audio period: 32 suffice, 16 do not (PHYSICS.md 3). */
  static final int CARRIER_SAMPLES = 32;

  static final int AUDIO_SAMPLES = 32;

  /**
   * Samples where the carrier alone is solved: cheap, and pulses as narrow as those of 150 thermal
   * voltages are still met by two samples.
   */
  private static final int LONE_CARRIER_SAMPLES = 64;

  private final Network network;
  final EnvelopeSolver modulated;
  final EnvelopeSolver carrierOnly;
  final CarrierSurroundings around;
  private final JunctionLaw[] junctions;

  Detection(Network network, DirectStage stage) {
    this.network = network;
    int ports = network.ports.length;
    modulated = new EnvelopeSolver(ports, CARRIER_SAMPLES, AUDIO_SAMPLES);
    carrierOnly = new EnvelopeSolver(ports, LONE_CARRIER_SAMPLES, 2);
    around =
        new CarrierSurroundings(ports, carrierOnly.carrierHarmonics(), modulated.audioHarmonics());
    junctions = new JunctionLaw[ports];
    for (int i = 0; i < ports; i++) {
      junctions[i] = stage.junction(network.ports[i].law().ordinal());
    }
  }

  void keep() {
    modulated.keep();
    carrierOnly.keep();
  }

  void recall() {
    modulated.recall();
    carrierOnly.recall();
  }

  /** Takes over DC: Thévenin's equivalent at each port about the present point. */
  void direct(DirectSolver direct, double[] scratch) {
    DirectStage stage = direct.stage();
    for (int i = 0; i < network.ports.length; i++) {
      around.seriesOhms[i] = network.ports[i].law().seriesOhms(stage);
      int anode = network.ports[i].law().anode(stage);
      int cathode = network.ports[i].law().cathode(stage);
      around.openVolts[i] = stage.volts(anode) - stage.volts(cathode);
    }
    for (int j = 0; j < network.ports.length; j++) {
      Port from = network.ports[j];
      direct.push(from.law().anode(stage), from.law().cathode(stage), scratch);
      for (int i = 0; i < network.ports.length; i++) {
        int anode = network.ports[i].law().anode(stage);
        int cathode = network.ports[i].law().cathode(stage);
        double ohms = (cathode < 0 ? 0 : scratch[cathode]) - (anode < 0 ? 0 : scratch[anode]);
        around.audioRealOhms[around.index(0, i, j)] = ohms;
        around.audioImaginaryOhms[around.index(0, i, j)] = 0;
        around.openVolts[i] += ohms * stage.drivenAmperes()[j];
      }
    }
  }

  /** Takes over the audio impedances. */
  void audio(AudioTable table, DirectStage stage) {
    for (int h = 1; h <= around.audioHarmonics(); h++) {
      for (int i = 0; i < network.ports.length; i++) {
        int anode = network.ports[i].law().anode(stage);
        int cathode = network.ports[i].law().cathode(stage);
        for (int j = 0; j < network.ports.length; j++) {
          int entry = around.index(h, i, j);
          around.audioRealOhms[entry] = table.re(h, j, cathode) - table.re(h, j, anode);
          around.audioImaginaryOhms[entry] = table.im(h, j, cathode) - table.im(h, j, anode);
        }
      }
    }
  }

  boolean solveModulated(double peakVolts, double depth, double toneRadians) {
    return modulated.solve(around, junctions, peakVolts, depth, toneRadians);
  }

  boolean solveCarrier(double peakVolts) {
    return carrierOnly.solve(around, junctions, peakVolts, 0, 0);
  }

  /**
   * Tunes as a builder does, for most detector DC: shifts the winding's resonance until it is in
   * phase with what drives it, the devices and their capacitances in place. A few rounds of the
   * unmodulated carrier suffice, since the shift is small against the bandwidth.
   *
   * @return ωc − ω0 at the peak, in rad/s; NaN where nothing converged
   */
  double peak(double peakVolts) {
    double shift = 0;
    for (int round = 0; round < 8; round++) {
      around.detuningRadians = shift;
      if (!solveCarrier(peakVolts)) {
        return Double.NaN;
      }
      double real = carrierOnly.feedReal[0];
      double imaginary = carrierOnly.feedImaginary[0];
      double drawnReal = carrierOnly.drawnReal(0);
      double drawnImaginary = carrierOnly.drawnImaginary(0);
      double reactive = drawnImaginary * real - drawnReal * imaginary;
      double next = -reactive / (2 * around.tankFarads * (real * real + imaginary * imaginary));
      boolean settled = Math.abs(next - shift) < 1e-7 / (around.tankFarads * around.tankOhms);
      shift = next;
      if (settled) {
        break;
      }
    }
    return shift;
  }
}
