package earward.sheet;

import earward.block.BlockType;
import earward.block.BlockTypes;
import earward.kit.design.KitDesign;
import earward.kit.design.SheetOptions;
import earward.kit.file.DesignFileException;
import earward.kit.file.Designs;
import earward.kit.file.PartsFiles;
import earward.kit.parts.PartsLibrary;
import earward.kit.path.Assembler;
import earward.kit.path.Assembly;
import earward.kit.review.ReviewedKit;
import earward.kit.review.Reviewer;
import java.nio.file.Path;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.ServiceLoader;

/** The starter kits of the templates, with our own blocks, solved and reviewed. */
final class StarterKits {
  static final List<String> NAMES = List.of("lantern", "hayloft", "boathouse");
  private static final Path TEMPLATES = Path.of("../../templates");

  private StarterKits() {}

  static KitDesign design(String name) throws DesignFileException {
    return Designs.read(TEMPLATES.resolve("kits/" + name + ".earward")).design();
  }

  static KitDesign german(KitDesign design) {
    SheetOptions now = design.sheet();
    return design.withSheet(
        new SheetOptions(
            now.paper(), "de", now.clubName(), now.kitNumber(), now.density(), now.written()));
  }

  static ReviewedKit reviewed(KitDesign design) throws DesignFileException {
    PartsLibrary library = PartsFiles.read(TEMPLATES.resolve("parts"));
    return Reviewer.review(design, new OnTheClassPath(), library);
  }

  static Assembly assembled(KitDesign design) throws DesignFileException {
    PartsLibrary library = PartsFiles.read(TEMPLATES.resolve("parts"));
    return Assembler.assemble(design, new OnTheClassPath(), library);
  }

  /** The blocks of the plug-in modules, from the class path. */
  private static final class OnTheClassPath implements BlockTypes {
    private final List<BlockType> types =
        ServiceLoader.load(BlockType.class).stream()
            .map(ServiceLoader.Provider::get)
            .sorted(Comparator.comparing(BlockType::id))
            .toList();

    @Override
    public Optional<BlockType> find(String typeId) {
      return types.stream().filter(type -> type.id().equals(typeId)).findFirst();
    }

    @Override
    public List<BlockType> all() {
      return types;
    }
  }
}
