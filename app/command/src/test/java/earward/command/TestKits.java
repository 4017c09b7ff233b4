package earward.command;

import static org.assertj.core.api.Assertions.assertThat;

import earward.block.BlockTypes;
import earward.block.check.Finding;
import earward.block.figure.FigureName;
import earward.host.PluginSet;
import earward.host.Plugins;
import earward.kit.design.KitDesign;
import earward.kit.file.DesignFileException;
import earward.kit.file.Designs;
import earward.kit.file.PartsFiles;
import earward.kit.parts.PartsLibrary;
import earward.kit.path.Assembler;
import earward.kit.path.Assembly;
import earward.kit.path.Figures;
import earward.kit.path.KitSolver;
import earward.kit.path.SolvedKit;
import earward.kit.review.ReviewFinding;
import earward.kit.review.ReviewedKit;
import earward.kit.review.Reviewer;
import java.util.List;
import java.util.Optional;

/** The starter kits, the plug-ins as jars and the parts library, for tests without a command. */
final class TestKits {
  private static final PluginSet TYPES = Plugins.load(TestHome.path().resolve("plugins"));
  private static final PartsLibrary PARTS = parts();

  private TestKits() {}

  static BlockTypes types() {
    return TYPES;
  }

  static PartsLibrary library() {
    return PARTS;
  }

  static KitDesign starter(String name) {
    try {
      return Designs.read(TestHome.starterKit(name)).design();
    } catch (DesignFileException e) {
      throw new AssertionError(e);
    }
  }

  static Assembly assembled(KitDesign design) {
    return Assembler.assemble(design, TYPES, PARTS);
  }

  static ReviewedKit reviewed(KitDesign design) {
    return Reviewer.review(design, TYPES, PARTS);
  }

  static List<Finding> findings(ReviewedKit reviewed) {
    return reviewed.findings().stream().map(ReviewFinding::finding).toList();
  }

  /** What one check of a kit finds, with no more solved than its own figures. */
  static Optional<Finding> found(Assembly assembly, String code, String subject) {
    List<FigureName> names =
        Reviewer.checks(assembly).stream()
            .filter(each -> each.check().code().equals(code) && each.subject().equals(subject))
            .map(each -> each.check().figure())
            .toList();
    assertThat(names).as("checks '%s' of '%s'", code, subject).isNotEmpty();
    Figures figures = KitSolver.figures(assembly, names);
    assertThat(figures.all()).as("%s", names).isNotEmpty();
    SolvedKit solved = new SolvedKit(assembly, figures, List.of(), true);
    return findings(Reviewer.review(solved, Reviewer.USUAL_LANGUAGE)).stream()
        .filter(f -> f.code().equals(code) && f.subject().equals(subject))
        .findFirst();
  }

  private static PartsLibrary parts() {
    try {
      return PartsFiles.read(TestHome.path().resolve("templates/parts"));
    } catch (DesignFileException e) {
      throw new AssertionError(e);
    }
  }
}
