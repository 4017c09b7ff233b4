package earward.block.testkit;

import earward.block.BlockDescription;
import earward.block.BlockType;
import earward.block.check.Check;
import earward.block.figure.FigureName;
import earward.block.figure.Quantity;
import earward.kit.path.Assembly;
import earward.kit.path.Figures;
import earward.kit.path.KitSolver;
import earward.kit.path.SolvedKit;
import java.util.HashSet;
import java.util.List;
import java.util.Set;

/**
 * In the smallest whole kit every case of the kit is solved with the block in it, and each figure
 * that its checks speak of comes out as a number. An edge of the band may be missing, where nothing
 * in the kit makes one.
 */
public final class WholeKitRule implements BlockRule {
  /** Solving a whole kit takes a while, so no more than this many variations are tried. */
  private static final int MOST_VARIATIONS = 6;

  @Override
  public List<String> faults(BlockType type, List<Variation> variations) {
    Faults faults = new Faults();
    Set<BlockDescription> seen = new HashSet<>();
    List<Variation> usual =
        variations.stream()
            .filter(Variation::usual)
            .filter(variation -> variation.attempt(type).filter(seen::add).isPresent())
            .toList();
    int step = Math.max(1, (usual.size() + MOST_VARIATIONS - 1) / MOST_VARIATIONS);
    for (int i = 0; i < usual.size(); i += step) {
      Variation variation = usual.get(i);
      variation.attempt(type).ifPresent(d -> tried(type, d, variation, faults));
    }
    return faults.all();
  }

  private static void tried(
      BlockType type, BlockDescription description, Variation variation, Faults faults) {
    Assembly assembly = TrialKit.around(type, description, variation);
    SolvedKit solved = KitSolver.solve(assembly);
    if (!solved.solved()) {
      faults.add(
          "with "
              + variation.name()
              + " a kit around it is not solved: "
              + TrialKit.sentences(assembly.findings())
              + TrialKit.sentences(solved.findings()));
      return;
    }
    for (Check check : description.checks()) {
      FigureName name = check.figure().within(TrialKit.BLOCK);
      faults.addIf(
          !isEdge(name) && Double.isNaN(value(solved.figures(), name)),
          "with "
              + variation.name()
              + (", check " + check.code() + " cannot be held: a kit around the block has no ")
              + name);
    }
  }

  private static boolean isEdge(FigureName name) {
    return name.quantity() == Quantity.LOW_EDGE_HERTZ
        || name.quantity() == Quantity.HIGH_EDGE_HERTZ;
  }

  private static double value(Figures figures, FigureName name) {
    double own = figures.orNaN(name);
    return Double.isNaN(own)
        ? figures.orNaN(new FigureName("seam." + name.place(), name.quantity(), name.caseName()))
        : own;
  }
}
