package earward.command;

import earward.host.PluginSet;
import earward.host.Plugins;
import earward.kit.file.DesignFileException;
import earward.kit.file.PartsFiles;
import earward.kit.parts.PartsLibrary;
import java.io.IOException;
import java.io.PrintWriter;
import java.net.URISyntaxException;
import java.nio.file.DirectoryIteratorException;
import java.nio.file.DirectoryStream;
import java.nio.file.Files;
import java.nio.file.InvalidPathException;
import java.nio.file.Path;
import java.security.CodeSource;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import org.jspecify.annotations.Nullable;

/** What lies in the runnable folder: the block types of {@code plugins/}, and the parts library. */
final class Program implements AutoCloseable {
  /** The system property by which the start script names the runnable folder. */
  static final String HOME = "earward.home";

  private final Path home;
  private final PluginSet types;

  private Program(Path home) {
    this.home = home;
    this.types = Plugins.load(home.resolve("plugins"));
  }

  /** The program of the folder that {@value #HOME} names, or that this class came from. */
  static Program open() throws CommandFault {
    String named = System.getProperty(HOME);
    try {
      if (named != null && !named.isBlank()) {
        return new Program(Path.of(named).toAbsolutePath());
      }
    } catch (InvalidPathException e) {
      throw CommandFault.ofInput(
          "The system property " + HOME + " is '" + named + "', which is no path of a folder.");
    }
    return new Program(
        unpacked()
            .orElseThrow(
                () ->
                    CommandFault.ofInput(
                        "The program does not know where its folder lies; start it by bin/earward,"
                            + " or name the folder with -D"
                            + HOME
                            + "=FOLDER.")));
  }

  /** The runnable folder where this class lies in a jar of its {@code lib/}. */
  private static Optional<Path> unpacked() {
    @Nullable CodeSource source = Program.class.getProtectionDomain().getCodeSource();
    if (source == null) {
      return Optional.empty();
    }
    try {
      @Nullable Path lib = Path.of(source.getLocation().toURI()).getParent();
      @Nullable Path folder = lib == null ? null : lib.getParent();
      return Optional.ofNullable(folder).filter(f -> Files.isDirectory(f.resolve("plugins")));
    } catch (URISyntaxException | IllegalArgumentException e) {
      return Optional.empty();
    }
  }

  PluginSet types() {
    return types;
  }

  PartsLibrary parts() throws CommandFault {
    try {
      return PartsFiles.read(home.resolve("templates").resolve("parts"));
    } catch (DesignFileException e) {
      throw CommandFault.ofInput(e.sentence());
    }
  }

  /** Where a club may keep its own wording of the sheet. */
  Path sheetWordings() {
    return home.resolve("templates").resolve("sheets");
  }

  /** The design files of the starter kits, by name; none where the folder cannot be read. */
  List<Path> starterKits() {
    List<Path> kits = new ArrayList<>();
    try (DirectoryStream<Path> files =
        Files.newDirectoryStream(home.resolve("templates").resolve("kits"), "*.earward")) {
      files.forEach(kits::add);
    } catch (IOException | DirectoryIteratorException e) {
      return List.of();
    }
    kits.sort(Comparator.naturalOrder());
    return kits;
  }

  /** Says on standard error which plug-ins are not used and why. */
  void sayRefusals(PrintWriter messages) {
    types.refusals().forEach(refusal -> Faults.say(messages, refusal.sentence()));
  }

  @Override
  public void close() throws CommandFault {
    try {
      types.close();
    } catch (IOException e) {
      throw CommandFault.ofProgram("A plug-in jar cannot be closed: " + e.getMessage() + ".");
    }
  }
}
