package earward.command;

import earward.block.BlockTexts;
import earward.kit.path.Assembly;
import earward.kit.path.PlacedBlock;
import earward.kit.path.PlacedTestPoint;
import earward.kit.review.Reviewer;

/** What the places of a kit are called. */
final class PlaceNames {
  private final Assembly assembly;

  PlaceNames(Assembly assembly) {
    this.assembly = assembly;
  }

  /** The designer's own words for a test point, or those of its block's type. */
  String of(PlacedTestPoint testPoint) {
    if (!testPoint.words().isEmpty()) {
      return testPoint.words();
    }
    for (PlacedBlock block : assembly.blocks()) {
      String prefix = block.id() + ".";
      if (testPoint.place().startsWith(prefix)) {
        String local = testPoint.place().substring(prefix.length());
        return BlockTexts.of(block.type(), Reviewer.USUAL_LANGUAGE)
            .find("test-point." + local)
            .orElse("");
      }
    }
    return "";
  }

  /** The reference of a part, {@code IC1}; empty where it has none. */
  String reference(String partPlace) {
    return assembly.references().ofPart(partPlace).orElse("");
  }
}
