package earward.timing.accuracy;

import java.io.PrintStream;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.EnumMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;

/**
 * Compares random designs both ways and prints the worst ten.
 *
 * @param seed of all draws
 * @param from number of the first design
 * @param count how many
 */
public record AccuracyRun(long seed, int from, int count) {
  /** The seed of the thousand that count. */
  public static final long SEED = 20_261_201;

  /** How many count. */
  public static final int ALL = 1000;

  private static final int SHOWN = 10;
  private static final double NANOS = 1e9;

  public AccuracyRun {
    if (from < 0 || count < 1) {
      throw new IllegalArgumentException(
          "designs from " + from + ", " + count + " of them; wanted are at least one from 0 on");
    }
  }

  /**
   * Runs it.
   *
   * @return 0 where every design is within the bar, else 1
   */
  public int run(PrintStream out) {
    List<Comparison> all = new ArrayList<>();
    long start = System.nanoTime();
    for (int number = from; number < from + count; number++) {
      Comparison one = Comparison.of(Draw.of(seed, number));
      all.add(one);
      if (!one.kept()) {
        out.println("MISSED " + one.text());
      }
    }
    double seconds = (System.nanoTime() - start) / NANOS;
    all.sort(Comparator.comparingDouble(Comparison::off).reversed());
    out.printf(Locale.ROOT, "%nThe worst of %d designs, seed %d:%n", count, seed);
    all.stream().limit(SHOWN).forEach(one -> out.println(one.text()));
    long missed = all.stream().filter(one -> !one.kept()).count();
    out.println();
    byKind(all).forEach((kind, line) -> out.println(line));
    out.printf(
        Locale.ROOT,
        "%d of %d designs within the bar; %.0f s, %.2f s a design%n",
        count - missed,
        count,
        seconds,
        seconds / count);
    return missed == 0 ? 0 : 1;
  }

  private static Map<DetectorKind, String> byKind(List<Comparison> all) {
    Map<DetectorKind, String> lines = new EnumMap<>(DetectorKind.class);
    for (DetectorKind kind : DetectorKind.values()) {
      List<Comparison> own = all.stream().filter(one -> one.draw().kind() == kind).toList();
      if (!own.isEmpty()) {
        long kept = own.stream().filter(Comparison::kept).count();
        lines.put(
            kind,
            String.format(
                Locale.ROOT,
                "%-22s %d of %d within; median %.3f, worst %.3f of the bar",
                kind.name().toLowerCase(Locale.ROOT).replace('_', ' '),
                kept,
                own.size(),
                own.get(own.size() / 2).off(),
                own.get(0).off()));
      }
    }
    return lines;
  }
}
