package earward.command;

import java.io.PrintStream;

/** The launcher's main: the command line of Earward. */
public final class Main {
  private Main() {}

  /**
   * Runs one command and ends the process with its exit code.
   *
   * @param arguments the command and its arguments
   */
  public static void main(String[] arguments) {
    System.exit(run(arguments, System.out, System.err));
  }

  /** Runs one command; returns 0 where it was done, 2 where the call is at fault. */
  static int run(String[] arguments, PrintStream results, PrintStream messages) {
    if (arguments.length == 1 && arguments[0].equals("--version")) {
      String version = Main.class.getPackage().getImplementationVersion();
      results.println("earward " + (version == null ? "(not packaged)" : version));
      return 0;
    }
    messages.println("usage: earward --version");
    return 2;
  }
}
