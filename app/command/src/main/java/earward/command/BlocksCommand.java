package earward.command;

import java.util.Objects;
import java.util.concurrent.Callable;
import org.jspecify.annotations.Nullable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.Spec;

/** The block types at hand, and the plug-ins that were refused. */
@Command(
    name = "blocks",
    description = "Lists the block types found, and the plug-ins refused with the reason.",
    mixinStandardHelpOptions = true,
    versionProvider = EarwardCommand.Version.class)
final class BlocksCommand implements Callable<Integer> {
  @Spec private @Nullable CommandSpec spec;

  @Option(names = "--json", description = "As JSON (blocks.schema.json).")
  private boolean json;

  @Override
  public Integer call() throws CommandFault {
    try (Program program = Program.open()) {
      var results = Objects.requireNonNull(spec).commandLine().getOut();
      if (json) {
        JsonOut.print(results, BlocksListing.json(program.types()));
      } else {
        BlocksListing.print(results, program.types());
      }
      return Exit.DONE;
    }
  }
}
