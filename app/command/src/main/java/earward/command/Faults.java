package earward.command;

import java.io.PrintWriter;
import java.nio.file.InvalidPathException;
import java.util.List;
import picocli.CommandLine;
import picocli.CommandLine.ParameterException;
import picocli.CommandLine.ParseResult;
import picocli.CommandLine.UnmatchedArgumentException;

/** Turns whatever ends a command into sentences on standard error; never a stack trace. */
final class Faults {
  private static final int FRAMES_SHOWN = 1;

  private Faults() {}

  static int ofCall(ParameterException thrown, String[] arguments) {
    CommandLine line = thrown.getCommandLine();
    String name = line.getCommandSpec().qualifiedName();
    say(line.getErr(), sentence(thrown, line, name));
    return Exit.INPUT_AT_FAULT;
  }

  private static String sentence(ParameterException thrown, CommandLine line, String name) {
    String help = "; '" + name + " --help' says what is wanted.";
    if (thrown instanceof UnmatchedArgumentException unmatched
        && !unmatched.getUnmatched().isEmpty()) {
      String found = unmatched.getUnmatched().get(0);
      if (unmatched.isUnknownOption()) {
        return "There is no option '" + found + "' in '" + name + "'" + help;
      }
      return line.getParent() == null
          ? "There is no command '"
              + found
              + "'; there are "
              + String.join(", ", line.getSubcommands().keySet())
              + "."
          : "'" + name + "' has no use for '" + found + "'" + help;
    }
    String told = String.valueOf(thrown.getMessage());
    if (told.contains(InvalidPathException.class.getName())) { // the parser keeps no cause
      return "'" + thrown.getValue() + "' is no name that a file can have here; give another.";
    }
    String what = told.strip().replaceAll("\\s+", " ");
    return (what.endsWith(".") ? what.substring(0, what.length() - 1) : what) + help;
  }

  static int ofExecution(Exception thrown, CommandLine line, ParseResult result) {
    if (thrown instanceof CommandFault fault) {
      fault.sentences().forEach(sentence -> say(line.getErr(), sentence));
      return fault.exitCode();
    }
    say(line.getErr(), unexpected(thrown));
    return Exit.PROGRAM_AT_FAULT;
  }

  /** What is said of a fault of the program itself: enough to report it. */
  static String unexpected(Throwable thrown) {
    List<StackTraceElement> frames = List.of(thrown.getStackTrace());
    String where = frames.isEmpty() ? "" : " at " + frames.subList(0, FRAMES_SHOWN).get(0);
    String what = thrown.getMessage() == null ? "" : " (" + thrown.getMessage() + ")";
    return "The program is at fault: "
        + thrown.getClass().getSimpleName()
        + what.replaceAll("\\s+", " ")
        + where
        + "; please report this with the design file.";
  }

  static void say(PrintWriter messages, String sentence) {
    messages.println("earward: " + Shown.plain(sentence));
  }
}
