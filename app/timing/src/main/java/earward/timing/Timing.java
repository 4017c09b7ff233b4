package earward.timing;

import org.openjdk.jmh.Main;

/** Starts the benchmarks; takes JMH's own arguments. */
public final class Timing {
  private Timing() {}

  /**
   * Runs the benchmarks that the arguments name, or all of them.
   *
   * @param arguments JMH's own arguments
   * @throws java.io.IOException where the results cannot be written
   */
  public static void main(String[] arguments) throws java.io.IOException {
    Main.main(arguments);
  }
}
