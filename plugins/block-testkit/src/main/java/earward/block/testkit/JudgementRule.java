package earward.block.testkit;

import earward.block.BlockDescription;
import earward.block.BlockType;
import earward.block.check.Finding;
import earward.block.figure.FigureName;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.TreeSet;

/** The block's judgement asks for figures that it has, and bears any of them, missing ones too. */
public final class JudgementRule implements BlockRule {
  private static final List<Double> FIGURES = List.of(Double.NaN, 0.0, 1.0, -1.0, 1e9);

  @Override
  public List<String> faults(BlockType type, List<Variation> variations) {
    Faults faults = new Faults();
    for (Variation variation : variations) {
      Optional<BlockDescription> description = variation.attempt(type);
      if (description.isPresent()) {
        Set<String> asked = new TreeSet<>();
        FIGURES.forEach(figure -> judge(type, variation, figure, asked, faults));
        FigurePlaces places = new FigurePlaces(description.get().wiring());
        asked.forEach(name -> figure(name, places, faults));
      }
    }
    return faults.all();
  }

  /** The texts by which the block's judgement speaks, whatever the figures. */
  static Set<String> textKeys(BlockType type, Variation variation) {
    Set<String> keys = new TreeSet<>();
    for (double each : FIGURES) {
      judged(type, variation, each).stream()
          .filter(finding -> finding.sentence().equals(Finding.textKey(finding.code())))
          .forEach(finding -> keys.add(finding.sentence()));
    }
    return keys;
  }

  private static List<Finding> judged(BlockType type, Variation variation, double figure) {
    try {
      return type.judge(variation.values(), variation.conditions(), name -> figure);
    } catch (RuntimeException e) {
      return List.of(); // faults() says so
    }
  }

  private static void judge(
      BlockType type, Variation variation, double figure, Set<String> asked, Faults faults) {
    try {
      List<Finding> findings =
          type.judge(
              variation.values(),
              variation.conditions(),
              name -> {
                asked.add(name);
                return figure;
              });
      for (Finding finding : findings) {
        faults.addIf(
            !finding.code().matches("[a-z0-9]+(-[a-z0-9]+)*"),
            "'"
                + finding.code()
                + "' is no code of a finding; wanted lower case words joined by hyphens");
      }
    } catch (RuntimeException e) {
      faults.add(
          "its judgement fails where every figure is "
              + (figure + ": " + e)
              + "; a figure that the kit does not have is NaN");
    }
  }

  private static void figure(String name, FigurePlaces places, Faults faults) {
    try {
      places
          .whyNot(FigureName.parse(name))
          .ifPresent(why -> faults.add("its judgement asks for " + name + ", not there " + why));
    } catch (IllegalArgumentException e) {
      faults.add("its judgement asks for a figure by a wrong name: " + e.getMessage());
    }
  }
}
