package earward.dist;

import static org.assertj.core.api.Assertions.assertThat;

import earward.block.BlockType;
import earward.block.BlockTypes;
import earward.block.check.Severity;
import earward.engine.CompiledCircuit;
import earward.kit.design.KitDesign;
import earward.kit.file.Designs;
import earward.kit.file.PartsFiles;
import earward.kit.parts.PartsLibrary;
import earward.kit.path.Assembler;
import earward.kit.path.Assembly;
import earward.kit.path.Figures;
import earward.kit.path.KitSolver;
import earward.kit.review.ReviewFinding;
import earward.kit.review.ReviewedKit;
import earward.kit.review.Reviewer;
import java.nio.file.Path;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.ServiceLoader;
import org.assertj.core.data.Offset;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** The starter kits with the blocks and the parts that are shipped with them. */
class StarterKitsTest {
  private static final Path TEMPLATES = Path.of("..", "..", "templates");

  private record Shipped(List<BlockType> all) implements BlockTypes {
    static Shipped types() {
      return new Shipped(
          ServiceLoader.load(BlockType.class).stream()
              .map(ServiceLoader.Provider::get)
              .sorted(Comparator.comparing(BlockType::id))
              .toList());
    }

    @Override
    public Optional<BlockType> find(String typeId) {
      return all.stream().filter(type -> type.id().equals(typeId)).findFirst();
    }
  }

  @ParameterizedTest
  @ValueSource(strings = {"lantern", "hayloft", "boathouse"})
  void aStarterKitAssemblesCompletelyUnderItsStoredReferences(String name) throws Exception {
    KitDesign design = kit(name);
    Assembly assembly = Assembler.assemble(design, Shipped.types(), library());
    assertThat(assembly.findings())
        .filteredOn(finding -> finding.severity() != Severity.NOTE)
        .isEmpty();
    assertThat(assembly.complete()).isTrue();
    assertThat(assembly.references()).isEqualTo(design.references());
  }

  @ParameterizedTest
  @ValueSource(strings = {"lantern", "hayloft", "boathouse"})
  void aStarterKitPassesItsOwnReview(String name) throws Exception {
    ReviewedKit reviewed = Reviewer.review(kit(name), Shipped.types(), library());
    assertThat(reviewed.solved().solved()).isTrue();
    assertThat(stops(reviewed)).isEmpty();
    assertThat(reviewed.doNotBuild()).isFalse();
  }

  @ParameterizedTest
  @ValueSource(strings = {"lantern", "hayloft", "boathouse"})
  void theHeadlineIsPartOfTheWholeAndTheSame(String name) throws Exception {
    Assembly assembly = Assembler.assemble(kit(name), Shipped.types(), library());
    CompiledCircuit headline = KitSolver.compileHeadline(assembly).circuit();
    double[] row = new double[headline.figures().size()];
    assertThat(headline.newSolver().solve(headline.nominalValues(), row).solved()).isTrue();
    Figures whole = KitSolver.solve(assembly).figures();
    assertThat(row).hasSizeGreaterThan(100);
    for (int i = 0; i < row.length; i++) {
      double wanted = whole.orNaN(headline.figures().get(i));
      if (Double.isNaN(wanted)) {
        assertThat(row[i]).as(headline.figures().get(i).toString()).isNaN();
      } else {
        assertThat(row[i])
            .as(headline.figures().get(i).toString())
            .isCloseTo(wanted, Offset.offset(1e-9 + 1e-6 * Math.abs(wanted)));
      }
    }
  }

  @Test
  void theBoathouseWithoutItsHeatSinkMustNotBeBuilt() throws Exception {
    KitDesign bare = kit("boathouse").withBlock("power", block -> block.with("cooling", "bare"));
    ReviewedKit reviewed = Reviewer.review(bare, Shipped.types(), library());
    assertThat(stops(reviewed)).containsExactly("junction-temperature");
  }

  private static List<String> stops(ReviewedKit reviewed) {
    return reviewed.findings().stream()
        .map(ReviewFinding::finding)
        .filter(finding -> finding.severity() == Severity.STOP)
        .map(finding -> finding.code())
        .toList();
  }

  private static KitDesign kit(String name) throws Exception {
    return Designs.read(TEMPLATES.resolve("kits").resolve(name + ".earward")).design();
  }

  private static PartsLibrary library() throws Exception {
    return PartsFiles.read(TEMPLATES.resolve("parts"));
  }
}
