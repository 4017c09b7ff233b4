package earward.kit.proposal;

import earward.block.check.Finding;
import earward.block.check.Severity;
import earward.kit.design.BlockEntry;
import earward.kit.design.KitDesign;
import earward.kit.design.SettingEntry;
import earward.kit.path.PlacedBlock;
import earward.kit.proposal.Proposal.Change;
import earward.kit.review.Remedy;
import earward.kit.review.ReviewFinding;
import earward.kit.review.ReviewedKit;
import earward.kit.review.Reviewer;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;

/** Looks for better values, one proven step after the other. Used once. */
final class PathProposal {
  /** Steps after which what is left is left. */
  private static final int MOST_STEPS = 12;

  private static final double WEIGHT_OF_STOP = 1e4;
  private static final double WEIGHT_OF_WEIGH = 100;

  private final KitDesign before;
  private final Stock stock;
  private final Set<String> kept;
  private final Map<String, String> reasons = new LinkedHashMap<>();
  private Bench bench;

  PathProposal(Bench bench, Stock stock, Set<String> kept) {
    this.bench = bench.checked(bench.design()).map(bench::at).orElse(bench);
    this.before = bench.design();
    this.stock = stock;
    this.kept = Set.copyOf(kept);
  }

  Proposal ofBlock(String blockId) {
    PlacedBlock block =
        bench
            .assembly()
            .block(blockId)
            .orElseThrow(
                () ->
                    new IllegalArgumentException(
                        "There is no block '"
                            + blockId
                            + "'; there are "
                            + String.join(
                                ", ",
                                bench.assembly().blocks().stream().map(PlacedBlock::id).toList())
                            + "."));
    if (block.type().proposer().isEmpty()) {
      throw new IllegalArgumentException(
          "Block '"
              + blockId
              + "' ("
              + block.type().id()
              + ") has no design equations; its values stay as they are.");
    }
    byEquations(block, false);
    return proposal();
  }

  Proposal ofPath() {
    for (PlacedBlock block : bench.assembly().blocks()) {
      byEquations(block, true);
    }
    Set<String> tried = new LinkedHashSet<>();
    for (int step = 0; step < MOST_STEPS; step++) {
      if (!byRemedy(tried)) {
        break;
      }
    }
    return proposal();
  }

  /** Takes what a block's equations give, where that is no worse, or where it must be better. */
  private void byEquations(PlacedBlock block, boolean better) {
    Equations equations = new Equations(bench, block, stock, kept);
    Optional<KitDesign> edited = equations.edited();
    if (edited.isEmpty()) {
      return;
    }
    ReviewedKit after = review(edited.get());
    double gain = score(bench.now()) - score(after);
    if (after.solved().solved() && (better ? gain > 0 : gain >= 0)) {
      note(edited.get(), "by the design equations of '" + block.type().id() + "'");
      take(after);
    }
  }

  /** Takes the best remedy of the weightiest finding that has one; false where none helps. */
  private boolean byRemedy(Set<String> tried) {
    for (ReviewFinding found : bench.now().findings()) {
      Finding finding = found.finding();
      if (finding.measured().isEmpty() || !tried.add(finding.code() + " " + finding.subject())) {
        continue;
      }
      for (Remedy remedy : new RemedySearch(bench, finding).remedies()) {
        ReviewedKit after = allowed(remedy) ? review(remedy.edited()) : bench.now();
        if (after.solved().solved() && score(after) < score(bench.now())) {
          note(remedy.edited(), "clears '" + finding.code() + "' of '" + finding.subject() + "'");
          take(after);
          tried.clear();
          return true;
        }
      }
    }
    return false;
  }

  private boolean allowed(Remedy remedy) {
    return differences(bench.design(), remedy.edited()).stream()
        .allMatch(
            change ->
                !kept.contains(change.block() + "." + change.setting())
                    && Equations.inStock(bench.assembly(), change, stock));
  }

  private void note(KitDesign edited, String why) {
    differences(bench.design(), edited)
        .forEach(change -> reasons.put(change.block() + "." + change.setting(), why));
  }

  private void take(ReviewedKit after) {
    bench = bench.at(after);
  }

  private ReviewedKit review(KitDesign design) {
    return bench.checked(design).orElse(bench.now());
  }

  private static double score(ReviewedKit reviewed) {
    double sum = 0;
    for (ReviewFinding found : reviewed.findings()) {
      Severity severity = found.finding().severity();
      if (severity == Severity.STOP) {
        sum += WEIGHT_OF_STOP;
      } else if (severity == Severity.WEIGH) {
        sum += WEIGHT_OF_WEIGH;
      } else {
        sum += 1;
      }
    }
    return reviewed.solved().solved() ? sum : Double.POSITIVE_INFINITY;
  }

  private Proposal proposal() {
    List<Change> changes =
        differences(before, bench.design()).stream()
            .map(
                change ->
                    new Change(
                        change.block(),
                        change.setting(),
                        change.from(),
                        change.to(),
                        reasons.getOrDefault(change.block() + "." + change.setting(), "")))
            .toList();
    ReviewedKit whole = Reviewer.review(bench.design(), bench.types(), bench.library());
    return new Proposal(bench.design(), changes, whole);
  }

  /** What differs between two designs of the same blocks; a setting not named has no words. */
  static List<Change> differences(KitDesign one, KitDesign other) {
    List<Change> changes = new ArrayList<>();
    for (BlockEntry block : other.blocks()) {
      Map<String, SettingEntry> former =
          one.block(block.id()).map(BlockEntry::settings).orElse(Map.of());
      block
          .settings()
          .forEach(
              (id, entry) -> {
                SettingEntry was = former.get(id);
                if (was == null || !words(was).equals(words(entry))) {
                  String from = was == null ? "" : words(was);
                  changes.add(new Change(block.id(), id, from, words(entry), ""));
                }
              });
    }
    return changes;
  }

  private static String words(SettingEntry entry) {
    if (entry instanceof SettingEntry.Words words) {
      return words.words();
    }
    return entry instanceof SettingEntry.Inline inline
        ? inline.model().name()
        : ((SettingEntry.Unread) entry).json();
  }
}
