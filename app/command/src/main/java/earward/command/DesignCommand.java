package earward.command;

import earward.block.check.Finding;
import earward.block.check.Severity;
import earward.host.PluginSet;
import earward.kit.file.DesignFileException;
import earward.kit.file.DesignReading;
import earward.kit.file.Designs;
import earward.kit.parts.PartsLibrary;
import earward.kit.path.Assembler;
import earward.kit.path.Assembly;
import earward.kit.path.KitSolver;
import earward.kit.path.SolvedKit;
import earward.kit.review.ReviewedKit;
import earward.kit.review.Reviewer;
import java.io.PrintWriter;
import java.nio.file.Path;
import java.util.List;
import java.util.Objects;
import java.util.concurrent.Callable;
import org.jspecify.annotations.Nullable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Parameters;
import picocli.CommandLine.Spec;

/** A command that works on one kit design: reads it, solves it, reviews it. */
@Command(mixinStandardHelpOptions = true, versionProvider = EarwardCommand.Version.class)
abstract class DesignCommand implements Callable<Integer> {
  @Spec private @Nullable CommandSpec spec;

  @Parameters(index = "0", paramLabel = "DESIGN", description = "A kit design (.earward).")
  private @Nullable Path file;

  @Override
  public final Integer call() throws CommandFault {
    begin();
    try (Program program = Program.open()) {
      DesignReading reading = read();
      program.sayRefusals(messages());
      reading.findings().forEach(finding -> Faults.say(messages(), finding.sentence()));
      ReviewedKit reviewed = review(reading, program.types(), program.parts());
      show(reviewed, program);
      return reviewed.doNotBuild() ? Exit.DO_NOT_BUILD : Exit.DONE;
    }
  }

  /** What may be got ready beside reading and solving. */
  void begin() {}

  /** What may be solved beside the kit itself, of a complete assembly. */
  void assembled(Assembly assembly) {}

  /** Shows or writes what the command is for. */
  abstract void show(ReviewedKit reviewed, Program program) throws CommandFault;

  /** What is still to be done to the review of a solved kit before it is shown. */
  ReviewedKit completed(ReviewedKit reviewed, PluginSet types, PartsLibrary parts)
      throws CommandFault {
    return reviewed;
  }

  final PrintWriter results() {
    return Objects.requireNonNull(spec).commandLine().getOut();
  }

  final PrintWriter messages() {
    return Objects.requireNonNull(spec).commandLine().getErr();
  }

  final Path file() {
    return Objects.requireNonNull(file);
  }

  private DesignReading read() throws CommandFault {
    if (file().toString().isEmpty()) {
      throw CommandFault.ofInput(
          "The name of the kit design is empty; name a file, for instance lantern.earward.");
    }
    try {
      return Designs.read(file());
    } catch (DesignFileException e) {
      throw CommandFault.ofInput(e.sentence());
    }
  }

  private ReviewedKit review(DesignReading reading, PluginSet types, PartsLibrary parts)
      throws CommandFault {
    Assembly assembly = Assembler.assemble(reading.design(), types, parts);
    if (!assembly.complete()) {
      throw CommandFault.ofInput(
          stops(assembly.findings()).stream().map(stop -> placed(stop, reading)).toList());
    }
    assembled(assembly);
    SolvedKit solved = KitSolver.solve(assembly);
    ReviewedKit reviewed = Reviewer.review(solved, Reviewer.USUAL_LANGUAGE);
    if (!solved.solved() && solved.findings().isEmpty()) {
      throw CommandFault.ofProgram(file() + ": the kit could not be solved, and nothing says why.");
    }
    return completed(reviewed, types, parts);
  }

  private static List<Finding> stops(List<Finding> findings) {
    return findings.stream()
        .filter(finding -> finding.severity() == Severity.STOP)
        .distinct()
        .toList();
  }

  /** The sentence with the file, and the place in it where what it is about stands. */
  private String placed(Finding finding, DesignReading reading) {
    String place = reading.placeOf(finding.subject()).map(at -> ", " + at).orElse("");
    return file() + place + ": " + finding.sentence();
  }
}
