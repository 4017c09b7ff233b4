package earward.desktop.model;

import earward.kit.design.KitDesign;
import earward.kit.path.Assembler;
import earward.kit.path.PlacedBlock;
import java.util.List;

/** The nodes of a design at which a take-off may join. */
final class Nodes {
  private Nodes() {}

  /** The nodes of the path, in its order; no rail and no ground. */
  static List<String> toJoin(KitDesign design, Workshop workshop) {
    return Assembler.assemble(design, workshop.types(), workshop.parts()).path().stream()
        .map(PlacedBlock::globalNodes)
        .flatMap(nodes -> nodes.values().stream())
        .filter(node -> !earward.block.wiring.Nodes.isShared(node))
        .distinct()
        .sorted()
        .toList();
  }
}
