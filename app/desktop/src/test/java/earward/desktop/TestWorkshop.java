package earward.desktop;

import earward.block.BlockType;
import earward.block.BlockTypes;
import earward.desktop.model.Workshop;
import earward.kit.file.DesignFileException;
import earward.kit.file.PartsFiles;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import java.util.ServiceLoader;

/** The blocks of ours from the test's class path, and the parts library and kits of the project. */
public final class TestWorkshop {
  private static final Path TEMPLATES = Path.of("..", "..", "templates");

  private TestWorkshop() {}

  /** The workshop. */
  public static Workshop open() throws DesignFileException {
    return open(List.of());
  }

  /** The workshop, with sentences on plug-ins that were refused. */
  public static Workshop open(List<String> refusals) throws DesignFileException {
    List<BlockType> all =
        ServiceLoader.load(BlockType.class).stream().map(ServiceLoader.Provider::get).toList();
    BlockTypes types =
        new BlockTypes() {
          @Override
          public Optional<BlockType> find(String typeId) {
            return all.stream().filter(type -> type.id().equals(typeId)).findFirst();
          }

          @Override
          public List<BlockType> all() {
            return all;
          }
        };
    return new Workshop(
        types,
        PartsFiles.read(TEMPLATES.resolve("parts")),
        List.of(kit("boathouse"), kit("hayloft"), kit("lantern")),
        refusals);
  }

  /** The file of a starter kit. */
  public static Path kit(String name) {
    return TEMPLATES.resolve("kits").resolve(name + ".earward");
  }
}
