package earward.timing;

import earward.host.PluginSet;
import earward.host.Plugins;
import earward.kit.design.KitDesign;
import earward.kit.file.DesignFileException;
import earward.kit.file.Designs;
import earward.kit.file.PartsFiles;
import earward.kit.parts.PartsLibrary;
import earward.kit.path.Assembler;
import earward.kit.path.Assembly;
import earward.kit.path.KitSolver;
import earward.kit.path.SolvedKit;
import java.io.IOException;
import java.nio.file.Path;
import java.util.List;

/** A starter kit out of the runnable folder, with the blocks and parts that it needs. */
final class StarterKit implements AutoCloseable {
  static final List<String> NAMES = List.of("lantern", "hayloft", "boathouse");

  private final PluginSet types;
  private final PartsLibrary library;
  private final KitDesign design;

  private StarterKit(PluginSet types, PartsLibrary library, KitDesign design) {
    this.types = types;
    this.library = library;
    this.design = design;
  }

  static StarterKit open(String name) {
    try {
      return new StarterKit(
          Plugins.load(Program.plugins()),
          PartsFiles.read(Program.home().resolve("templates/parts")),
          Designs.read(file(name)).design());
    } catch (DesignFileException e) {
      throw new IllegalStateException(e.getMessage(), e);
    }
  }

  static Path file(String name) {
    return Program.home().resolve("templates/kits").resolve(name + ".earward");
  }

  /** The design as the program sees it after an edit: its blocks described and joined anew. */
  Assembly assembled() {
    Assembly assembly = Assembler.assemble(design, types, library);
    if (!assembly.complete()) {
      throw new IllegalStateException(assembly.findings().get(0).sentence());
    }
    return assembly;
  }

  /** All figures of the design, from the design itself. */
  SolvedKit solved() {
    SolvedKit kit = KitSolver.solve(assembled());
    if (!kit.solved()) {
      throw new IllegalStateException("not solved: " + kit.findings());
    }
    return kit;
  }

  @Override
  public void close() throws IOException {
    types.close();
  }
}
