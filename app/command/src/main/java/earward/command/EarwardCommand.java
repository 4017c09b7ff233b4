package earward.command;

import java.util.Objects;
import java.util.Optional;
import java.util.concurrent.Callable;
import org.jspecify.annotations.Nullable;
import picocli.CommandLine.Command;
import picocli.CommandLine.IVersionProvider;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Spec;

/** The command line as a whole; without a command it opens the desktop. */
@Command(
    name = "earward",
    description = "Designs the back end of an AM receiver kit and prints its build sheet.",
    mixinStandardHelpOptions = true,
    versionProvider = EarwardCommand.Version.class,
    subcommands = {
      SheetCommand.class,
      FiguresCommand.class,
      ReviewCommand.class,
      BatchCommand.class,
      FaultsCommand.class,
      DiagnoseCommand.class,
      ProveCommand.class,
      ProposeCommand.class,
      BlocksCommand.class,
      DesktopCommand.class
    },
    footer = {
      "",
      "Exit code: 0 done; 1 done, and a finding is STOP; 2 the input or the call is at fault;",
      "3 the program is at fault. Results go to standard output, messages to standard error."
    })
final class EarwardCommand implements Callable<Integer> {
  @Spec private @Nullable CommandSpec spec;

  @Override
  public Integer call() throws CommandFault {
    return DesktopCommand.open(
        Optional.empty(), Objects.requireNonNull(spec).commandLine().getErr());
  }

  /** The version of the jar that this class came in. */
  static final class Version implements IVersionProvider {
    @Override
    public String[] getVersion() {
      String version = Main.class.getPackage().getImplementationVersion();
      return new String[] {"earward " + (version == null ? "(not packaged)" : version)};
    }
  }
}
