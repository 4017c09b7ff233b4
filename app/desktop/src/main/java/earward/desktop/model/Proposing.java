package earward.desktop.model;

import earward.block.check.Severity;
import earward.kit.design.BlockEntry;
import earward.kit.design.KitDesign;
import earward.kit.design.References;
import earward.kit.review.ReviewedKit;
import java.util.ArrayList;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;

/**
 * Chooses for the designer: for an empty path the blocks of that starter kit which does best under
 * the design's own conditions, then values by the program's proposals. Everything was solved before
 * it is shown; nothing is taken before the designer agrees.
 */
public final class Proposing {
  private static final int WEIGHT_OF_STOP = 1000;
  private static final int WEIGHT_OF_WEIGH = 10;

  private final Workshop workshop;
  private final Solving solving;
  private final Chooser chooser;

  /** Chooses values for a reviewed design. */
  @FunctionalInterface
  public interface Chooser {
    /** The design with better values, locked ones left alone; the same where none are better. */
    KitDesign better(ReviewedKit reviewed, Set<String> locked);
  }

  /**
   * What is proposed.
   *
   * @param edited the whole design
   * @param review of it
   * @param differences to the design as it stood
   * @param from the starter kit whose blocks were taken; empty where the path had its own
   */
  public record Offer(
      KitDesign edited, ReviewedKit review, List<Difference> differences, String from) {
    public Offer {
      differences = List.copyOf(differences);
    }

    /** How many findings of a severity the proposal leaves. */
    public int count(Severity severity) {
      return Proposing.count(review, severity);
    }
  }

  /** Proposals with the blocks and parts of a workshop. */
  public Proposing(Workshop workshop, Solving solving, Chooser chooser) {
    this.workshop = workshop;
    this.solving = solving;
    this.chooser = chooser;
  }

  /** A proposal for a design; empty where there is nothing better. Off the event thread. */
  public Optional<Offer> propose(KitDesign design, Forms forms) {
    String from = "";
    ReviewedKit best = null;
    if (design.path().isEmpty()) {
      for (StarterKit kit : StarterKit.all(workshop)) {
        ReviewedKit tried = solving.review(furnished(design, kit.design()));
        if (best == null || weight(tried) < weight(best)) {
          best = tried;
          from = kit.design().title();
        }
      }
    } else {
      best = solving.review(design);
    }
    if (best == null) {
      return Optional.empty();
    }
    KitDesign start = best.solved().assembly().design();
    KitDesign better = chooser.better(best, locked(start));
    ReviewedKit after = better.equals(start) ? best : solving.review(better);
    ReviewedKit chosen = weight(after) <= weight(best) ? after : best;
    KitDesign edited = chosen.solved().assembly().design();
    return edited.equals(design)
        ? Optional.empty()
        : Optional.of(new Offer(edited, chosen, Difference.ofValues(forms, design, edited), from));
  }

  /** The design with the blocks of a starter kit, under its own conditions and title. */
  static KitDesign furnished(KitDesign design, KitDesign kit) {
    KitDesign with = design.withPath(kit.path());
    for (BlockEntry supply : kit.supplies()) {
      with = with.block(supply.id()).isEmpty() ? with.addSupply(supply) : with;
    }
    for (BlockEntry takeOff : kit.takeOffs()) {
      with = with.block(takeOff.id()).isEmpty() ? with.addTakeOff(takeOff) : with;
    }
    return with.withReferences(References.NONE);
  }

  /** The settings that are locked, {@code detector.c1}. */
  static Set<String> locked(KitDesign design) {
    Set<String> locked = new LinkedHashSet<>();
    for (BlockEntry block : design.blocks()) {
      block.locked().forEach(setting -> locked.add(block.id() + "." + setting));
    }
    return locked;
  }

  private static int weight(ReviewedKit kit) {
    int unsolved = kit.solved().solved() ? 0 : 100 * WEIGHT_OF_STOP;
    return unsolved
        + count(kit, Severity.STOP) * WEIGHT_OF_STOP
        + count(kit, Severity.WEIGH) * WEIGHT_OF_WEIGH
        + count(kit, Severity.NOTE);
  }

  private static int count(ReviewedKit kit, Severity severity) {
    return (int)
        new ArrayList<>(kit.findings())
            .stream().filter(found -> found.finding().severity() == severity).count();
  }
}
