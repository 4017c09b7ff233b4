package earward.timing;

import earward.block.device.Capacitor;
import earward.block.device.CarrierGenerator;
import earward.block.device.Device;
import earward.block.device.Dielectric;
import earward.block.device.Diode;
import earward.block.device.DiodeMaterial;
import earward.block.device.DiodeModel;
import earward.block.device.Resistor;
import earward.block.device.Terminal;
import earward.block.figure.CaseName;
import earward.block.figure.FigureName;
import earward.block.figure.Quantity;
import earward.engine.Circuit;
import earward.engine.CircuitPart;
import earward.engine.CompiledCircuit;
import earward.engine.Drive;
import earward.engine.Engine;
import earward.engine.Slot;
import earward.engine.SolveCase;
import earward.engine.Solver;
import java.io.PrintStream;
import java.lang.management.ManagementFactory;
import java.lang.management.ThreadMXBean;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.SplittableRandom;

/**
 * What one perturbed solve of a detector with its filter costs, against the nodes of the filter,
 * the diodes that the carrier drives, and its peak: narrower pulses ask for finer samples, and so
 * for more harmonics. Warm, by the time that the thread has had on its core.
 */
final class CostTable {
  private static final int KITS = 100;

  /** Longest time of a row, warming up included. */
  private static final double LONGEST_MICROSECONDS = 3e6;

  private static final double NANOS_A_MICROSECOND = 1e3;
  private static final int[] SECTIONS = {2, 5, 10, 20, 40};
  private static final int[] DIODES = {1, 2, 3};
  private static final double[] PEAKS = {0.3, 1, 3, 8};

  private static final DiodeModel DIODE =
      new DiodeModel(
          "of the table",
          DiodeMaterial.SCHOTTKY,
          1e-7,
          1e-7,
          1e-7,
          1.05,
          20,
          2e-12,
          0.5,
          0.4,
          20e6,
          50,
          0);

  private CostTable() {}

  /** Prints the table; 0 where all was solved. */
  static int print(PrintStream out) {
    out.println("one perturbed solve of one case, microseconds of one core");
    for (int sections : SECTIONS) {
      row(out, "nodes of the filter", sections + 2, circuit(1, sections, 1));
    }
    for (int diodes : DIODES) {
      row(out, "carrier-driven diodes", diodes, circuit(diodes, 5, 1));
    }
    for (double peak : PEAKS) {
      row(out, "carrier peak, V", peak, circuit(1, 5, peak));
    }
    return 0;
  }

  private static void row(PrintStream out, String what, double count, CompiledCircuit circuit) {
    out.printf(Locale.ROOT, "%-24s %5.4g %10.1f%n", what, count, microseconds(circuit));
  }

  private static double microseconds(CompiledCircuit circuit) {
    ThreadMXBean threads = ManagementFactory.getThreadMXBean();
    Solver solver = circuit.newSolver();
    double[] figures = new double[circuit.figures().size()];
    SplittableRandom random = new SplittableRandom(1);
    double[][] rows = new double[KITS][];
    for (int i = 0; i < KITS; i++) {
      rows[i] = circuit.nominalValues();
      for (int k = 0; k < rows[i].length; k++) {
        double tolerance = circuit.slots().get(k).tolerance().usualFraction();
        rows[i][k] *= 1 + tolerance * (2 * random.nextDouble() - 1);
      }
    }
    double best = Double.POSITIVE_INFINITY;
    double spent = 0;
    while (spent < LONGEST_MICROSECONDS) {
      long start = threads.getCurrentThreadCpuTime();
      int solved = 0;
      double taken = 0;
      while (solved < KITS && taken < LONGEST_MICROSECONDS) {
        if (!solver.solve(rows[solved++], figures).solved()) {
          throw new IllegalStateException("a circuit of the table was not solved");
        }
        taken = (threads.getCurrentThreadCpuTime() - start) / NANOS_A_MICROSECOND;
      }
      best = Math.min(best, taken / solved);
      spent += taken;
    }
    return best;
  }

  /** Detectors side by side on one generator, the first of them with a ladder of sections. */
  private static CompiledCircuit circuit(int diodes, int sections, double peakVolts) {
    List<CircuitPart> parts = new ArrayList<>();
    add(parts, "feed", new CarrierGenerator(330), Terminal.TOP, "in", Terminal.BOTTOM);
    for (int d = 0; d < diodes; d++) {
      String node = "a" + d;
      parts.add(
          new CircuitPart(
              "detector.d" + d,
              new Diode(DIODE),
              Map.of(Terminal.ANODE, "in", Terminal.CATHODE, node)));
      add(parts, "detector.c" + d, film(1e-9), Terminal.A, node, Terminal.B);
      add(parts, "detector.r" + d, new Resistor(22e3), Terminal.A, node, Terminal.B);
    }
    String before = "a0";
    for (int s = 0; s < sections; s++) {
      String node = "n" + s;
      parts.add(
          new CircuitPart(
              "filter.r" + s, new Resistor(1e3), Map.of(Terminal.A, before, Terminal.B, node)));
      add(parts, "filter.c" + s, film(1e-10), Terminal.A, node, Terminal.B);
      before = node;
    }
    List<FigureName> wanted = new ArrayList<>();
    for (Quantity quantity :
        List.of(Quantity.DC_VOLTS, Quantity.AUDIO_RMS_VOLTS, Quantity.DISTORTION)) {
      wanted.add(new FigureName(before, quantity, CaseName.TEST));
    }
    SolveCase test =
        new SolveCase(
            CaseName.TEST,
            Drive.SIGNAL,
            Map.of(
                Slot.CARRIER_HERTZ, 455e3,
                Slot.CARRIER_PEAK_VOLTS, peakVolts,
                Slot.DEPTH, 0.3,
                Slot.TONE_HERTZ, 400.0));
    return Engine.compile(new Circuit(parts, List.of(), List.of()), List.of(test), wanted);
  }

  private static void add(
      List<CircuitPart> parts,
      String name,
      Device device,
      Terminal hot,
      String node,
      Terminal cold) {
    parts.add(new CircuitPart(name, device, Map.of(hot, node, cold, Circuit.GROUND)));
  }

  private static Capacitor film(double farads) {
    return new Capacitor(farads, Dielectric.FILM, 63, 0, 0);
  }
}
