package earward.desktop.model;

import earward.block.check.Severity;
import earward.kit.design.KitDesign;
import earward.kit.proposal.Remedies;
import earward.kit.review.Remedy;
import earward.kit.review.ReviewFinding;
import earward.kit.review.ReviewedKit;
import earward.kit.review.Reviewer;
import java.util.Optional;
import java.util.Set;

/** Chooses values by proven remedies, the weightiest finding first, until none clears any more. */
public final class KitChooser implements Proposing.Chooser {
  private static final int MOST_STEPS = 6;

  private final Workshop workshop;

  /** Choices with the blocks and parts of a workshop. */
  public KitChooser(Workshop workshop) {
    this.workshop = workshop;
  }

  @Override
  public KitDesign better(ReviewedKit reviewed, Set<String> locked) {
    ReviewedKit now = reviewed;
    for (int step = 0; step < MOST_STEPS; step++) {
      if (now.findings().stream().noneMatch(KitChooser::weighs)) {
        break;
      }
      ReviewedKit sought = Remedies.sought(now, workshop.types(), workshop.parts());
      KitDesign before = now.solved().assembly().design();
      Optional<Remedy> remedy =
          sought.findings().stream()
              .filter(KitChooser::weighs)
              .flatMap(found -> found.remedies().stream())
              .filter(each -> keeps(before, each.edited(), locked))
              .findFirst();
      if (remedy.isEmpty()) {
        break;
      }
      now = Reviewer.review(remedy.get().edited(), workshop.types(), workshop.parts());
    }
    return now.solved().assembly().design();
  }

  private static boolean weighs(ReviewFinding found) {
    return found.finding().severity() != Severity.NOTE;
  }

  private static boolean keeps(KitDesign before, KitDesign after, Set<String> locked) {
    return locked.stream()
        .allMatch(
            name -> {
              int dot = name.indexOf('.');
              String block = name.substring(0, dot);
              String setting = name.substring(dot + 1);
              return before
                  .block(block)
                  .map(entry -> entry.settings().get(setting))
                  .equals(after.block(block).map(entry -> entry.settings().get(setting)));
            });
  }
}
