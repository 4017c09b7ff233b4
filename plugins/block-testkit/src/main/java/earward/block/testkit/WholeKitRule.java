package earward.block.testkit;

import earward.block.BlockDescription;
import earward.block.BlockType;
import earward.block.check.Check;
import earward.block.figure.CaseName;
import earward.block.figure.FigureName;
import earward.block.figure.Quantity;
import earward.kit.path.Assembly;
import earward.kit.path.Figures;
import earward.kit.path.KitSolver;
import earward.kit.path.SolvedKit;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.function.Consumer;

/**
 * In the smallest whole kit every case of the kit is solved with the block in it, and each figure
 * that its checks speak of comes out as a number. An edge of the band may be missing, where nothing
 * in the kit makes one.
 */
public final class WholeKitRule implements BlockRule {
  /** Solving a whole kit takes a while, so no more than this many variations are tried. */
  private static final int MOST_VARIATIONS = 6;

  private final Consumer<String> said;

  /** Says nothing but faults. */
  public WholeKitRule() {
    this(line -> {});
  }

  /**
   * Says also how the block's checks came out and how its diodes and transistors rest.
   *
   * @param said takes a line each
   */
  public WholeKitRule(Consumer<String> said) {
    this.said = said;
  }

  @Override
  public List<String> faults(BlockType type, List<Variation> variations) {
    Trial trial = new Trial(type);
    Set<BlockDescription> seen = new HashSet<>();
    List<Variation> usual =
        variations.stream()
            .filter(Variation::usual)
            .filter(variation -> variation.attempt(type).filter(seen::add).isPresent())
            .toList();
    int step = Math.max(1, (usual.size() + MOST_VARIATIONS - 1) / MOST_VARIATIONS);
    for (int i = 0; i < usual.size(); i += step) {
      Variation variation = usual.get(i);
      variation.attempt(type).ifPresent(description -> trial.run(description, variation));
    }
    trial.lines().forEach(said);
    return trial.faults.all();
  }

  /** All variations of one block. */
  private static final class Trial {
    private final BlockType type;
    private final Faults faults = new Faults();
    private final HeldInTrial held = new HeldInTrial();
    private final RestingState resting = new RestingState();
    private int solvedVariations;

    Trial(BlockType type) {
      this.type = type;
    }

    void run(BlockDescription description, Variation variation) {
      Assembly assembly = TrialKit.around(type, RestingState.asking(description), variation);
      SolvedKit solved = KitSolver.solve(assembly);
      if (!solved.solved()) {
        faults.addIn(
            variation,
            "a kit around it is not solved: "
                + TrialKit.sentences(assembly.findings())
                + TrialKit.sentences(solved.findings()));
        return;
      }
      solvedVariations++;
      resting.add(description, name -> value(solved.figures(), name.within(TrialKit.BLOCK)));
      for (Check check : description.checks()) {
        FigureName name = check.figure().within(TrialKit.BLOCK);
        double figure = value(solved.figures(), name);
        held.add(check, figure, variation);
        if (!isEdge(name) && Double.isNaN(figure)) {
          faults.addIn(variation, cannotBeHeld(check, description, assembly));
        }
      }
    }

    private static String cannotBeHeld(
        Check check, BlockDescription description, Assembly assembly) {
      FigureName figure = check.figure();
      String missing =
          "check " + check.code() + " cannot be held: a kit around the block has no " + figure;
      Optional<String> why = new FigurePlaces(description.wiring()).whyNot(figure);
      if (why.isPresent()) {
        return missing + ", not there " + why.get();
      }
      List<CaseName> others =
          CaseName.ALL.stream()
              .filter(name -> has(assembly, figure.in(name).within(TrialKit.BLOCK)))
              .toList();
      return missing
          + (others.isEmpty()
              ? "; no case has it: see the table of earward.block.figure, and whether the signal"
                  + " gets there, which a misspelt node prevents"
              : "; there is one in the cases " + others + ": take one of these");
    }

    private static boolean has(Assembly assembly, FigureName name) {
      FigureName atSeam = new FigureName("seam." + name.place(), name.quantity(), name.caseName());
      return !Double.isNaN(KitSolver.figure(assembly, name))
          || !Double.isNaN(KitSolver.figure(assembly, atSeam));
    }

    List<String> lines() {
      List<String> lines = new ArrayList<>(held.lines());
      lines.addAll(resting.lines());
      if (!lines.isEmpty()) {
        lines.add(
            0,
            type.id()
                + " in the contract's plain kit, usual values, "
                + solvedVariations
                + (solvedVariations == 1 ? " variation" : " variations")
                + "; to be looked at, no fault:");
      }
      return lines.stream().map(line -> lines.indexOf(line) == 0 ? line : "  " + line).toList();
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
