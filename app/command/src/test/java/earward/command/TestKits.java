package earward.command;

import earward.block.BlockTypes;
import earward.block.check.Finding;
import earward.host.PluginSet;
import earward.host.Plugins;
import earward.kit.design.KitDesign;
import earward.kit.file.DesignFileException;
import earward.kit.file.Designs;
import earward.kit.file.PartsFiles;
import earward.kit.parts.PartsLibrary;
import earward.kit.path.Assembler;
import earward.kit.path.Assembly;
import earward.kit.review.ReviewFinding;
import earward.kit.review.ReviewedKit;
import earward.kit.review.Reviewer;
import java.util.List;

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

  private static PartsLibrary parts() {
    try {
      return PartsFiles.read(TestHome.path().resolve("templates/parts"));
    } catch (DesignFileException e) {
      throw new AssertionError(e);
    }
  }
}
