package earward.engine.waveform;

/**
 * The drive E·(1 + m·cos ωm·t)·cos ωc·t at the stages of each step, the tone's period being a whole
 * number of carrier cycles. Mutable in its present cycle, for one thread.
 */
final class Drive {
  final int steps;
  final int cycles;
  private final double peak;
  private final double depth;
  private final double[] carrier;
  private final double[] cosine;
  private final double[] sine;
  private double cycleCosine = 1;
  private double cycleSine;

  Drive(double peakVolts, double depth, int cycles, int steps) {
    this.peak = peakVolts;
    this.depth = depth;
    this.cycles = cycles;
    this.steps = steps;
    carrier = new double[2 * steps];
    cosine = new double[2 * steps];
    sine = new double[2 * steps];
    for (int n = 0; n < steps; n++) {
      for (int stage = 0; stage < 2; stage++) {
        double turn = 2 * Math.PI * (n + (stage == 0 ? StepTables.FIRST : 1)) / steps;
        carrier[2 * n + stage] = Math.cos(turn);
        cosine[2 * n + stage] = Math.cos(turn / cycles);
        sine[2 * n + stage] = Math.sin(turn / cycles);
      }
    }
  }

  void begin(int cycle) {
    cycleCosine = Math.cos(2 * Math.PI * cycle / cycles);
    cycleSine = Math.sin(2 * Math.PI * cycle / cycles);
  }

  /** Volts at a stage of a step of the present cycle. */
  double at(int step, int stage) {
    int i = 2 * step + stage;
    double tone = cycleCosine * cosine[i] - cycleSine * sine[i];
    return peak * (1 + depth * tone) * carrier[i];
  }
}
