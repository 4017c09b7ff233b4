package earward.command;

import earward.block.check.Finding;
import earward.desktop.Desktop;
import earward.desktop.model.Workshop;
import java.awt.GraphicsEnvironment;
import java.io.PrintWriter;
import java.nio.file.Path;
import java.util.Objects;
import java.util.Optional;
import java.util.concurrent.Callable;
import org.jspecify.annotations.Nullable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Parameters;
import picocli.CommandLine.Spec;

/** Opens the desktop and waits until its window is closed. */
@Command(
    name = "desktop",
    description = "Opens the desktop, with a kit design where one is named.",
    mixinStandardHelpOptions = true,
    versionProvider = EarwardCommand.Version.class)
final class DesktopCommand implements Callable<Integer> {
  @Spec private @Nullable CommandSpec spec;

  @Parameters(arity = "0..1", paramLabel = "DESIGN", description = "A kit design (.earward).")
  private @Nullable Path design;

  @Override
  public Integer call() throws CommandFault {
    return open(Optional.ofNullable(design), Objects.requireNonNull(spec).commandLine().getErr());
  }

  /** Opens the window; without a display one sentence says what to do instead. */
  static int open(Optional<Path> design, PrintWriter messages) throws CommandFault {
    if (GraphicsEnvironment.isHeadless()) {
      throw CommandFault.ofInput(
          "The desktop needs a display, and there is none;"
              + " 'earward --help' lists the commands that work without one.");
    }
    try (Program program = Program.open()) {
      program.sayRefusals(messages);
      Desktop.run(
          new Workshop(
              program.types(),
              program.parts(),
              program.starterKits(),
              program.types().refusals().stream().map(Finding::sentence).toList()),
          design);
      return Exit.DONE;
    } catch (InterruptedException e) {
      Thread.currentThread().interrupt();
      throw CommandFault.ofProgram("The desktop was interrupted.");
    }
  }
}
