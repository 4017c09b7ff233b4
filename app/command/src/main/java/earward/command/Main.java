package earward.command;

import java.io.FileDescriptor;
import java.io.FileOutputStream;
import java.io.OutputStream;
import java.io.PrintStream;
import java.io.PrintWriter;
import java.nio.charset.StandardCharsets;
import picocli.CommandLine;
import picocli.CommandLine.Help.Ansi;

/** The launcher's main: the command line of Earward. */
public final class Main {
  private Main() {}

  /**
   * Runs one command and ends the process with its exit code. Output is UTF-8 whatever the locale.
   *
   * @param arguments the command and its arguments
   */
  public static void main(String[] arguments) {
    PrintStream messages =
        new PrintStream(new FileOutputStream(FileDescriptor.err), false, StandardCharsets.UTF_8);
    System.exit(run(arguments, new FileOutputStream(FileDescriptor.out), messages));
  }

  /** Runs one command; returns its exit code, see {@link Exit}. */
  static int run(String[] arguments, OutputStream results, PrintStream messages) {
    ResultsOutput watched = new ResultsOutput(results);
    PrintWriter out = new PrintWriter(watched, false, StandardCharsets.UTF_8);
    PrintWriter err = new PrintWriter(messages, true, StandardCharsets.UTF_8);
    CommandLine line = new CommandLine(new EarwardCommand());
    line.setOut(out)
        .setErr(err)
        .setExpandAtFiles(false)
        .setColorScheme(CommandLine.Help.defaultColorScheme(Ansi.OFF))
        .setParameterExceptionHandler(Faults::ofCall)
        .setExecutionExceptionHandler(Faults::ofExecution);
    int code = line.execute(arguments);
    out.flush();
    err.flush();
    if (watched.failure().isPresent()) {
      messages.println("earward: " + watched.failure().get());
      messages.flush();
      return Math.max(code, Exit.INPUT_AT_FAULT);
    }
    return code;
  }
}
