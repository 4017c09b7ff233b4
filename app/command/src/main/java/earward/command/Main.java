package earward.command;

import earward.block.BlockTexts;
import earward.block.BlockType;
import earward.block.check.Finding;
import earward.host.PluginSet;
import earward.host.Plugins;
import java.io.IOException;
import java.io.PrintStream;
import java.nio.file.Path;
import java.util.Locale;

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

  /**
   * Runs one command; returns 0 where it was done, 2 where the call is at fault, 3 where the
   * program is.
   */
  static int run(String[] arguments, PrintStream results, PrintStream messages) {
    String command = arguments.length == 1 ? arguments[0] : "";
    if (command.equals("--version")) {
      String version = Main.class.getPackage().getImplementationVersion();
      results.println("earward " + (version == null ? "(not packaged)" : version));
      return 0;
    }
    if (command.equals("blocks")) {
      return blocks(results, messages);
    }
    messages.println("usage: earward blocks | --version");
    return 2;
  }

  private static int blocks(PrintStream results, PrintStream messages) {
    Path folder = Path.of(System.getProperty("earward.home", "."), "plugins");
    try (PluginSet set = Plugins.load(folder)) {
      for (BlockType type : set.all()) {
        String name = BlockTexts.of(type, Locale.ENGLISH).get("name");
        String from = set.pluginOf(type.id()).orElseThrow().id();
        results.println(type.id() + "\t" + name + "\t" + from);
      }
      for (Finding refusal : set.refusals()) {
        results.println(refusal.severity() + "\t" + refusal.sentence());
      }
      return 0;
    } catch (IOException e) {
      messages.println("earward: a plug-in jar cannot be closed: " + e.getMessage());
      return 3;
    }
  }
}
