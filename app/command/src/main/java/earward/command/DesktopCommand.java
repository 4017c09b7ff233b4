package earward.command;

import java.nio.file.Path;
import java.util.concurrent.Callable;
import org.jspecify.annotations.Nullable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Parameters;

/** Opens the desktop. */
@Command(
    name = "desktop",
    description = "Opens the desktop, with a kit design where one is named.",
    mixinStandardHelpOptions = true,
    versionProvider = EarwardCommand.Version.class)
final class DesktopCommand implements Callable<Integer> {
  @Parameters(arity = "0..1", paramLabel = "DESIGN", description = "A kit design (.earward).")
  private @Nullable Path design;

  @Override
  public Integer call() throws CommandFault {
    throw CommandFault.ofInput(
        "This build has no desktop"
            + (design == null ? "" : " to open '" + design + "' in")
            + " yet; 'earward --help' lists the commands that it has.");
  }
}
