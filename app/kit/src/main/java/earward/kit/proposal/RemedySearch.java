package earward.kit.proposal;

import earward.block.check.Check;
import earward.block.check.Finding;
import earward.block.check.Finding.Measured;
import earward.block.check.Relation;
import earward.block.check.RemedyHint;
import earward.block.check.RemedyHint.Direction;
import earward.block.device.PartKind;
import earward.block.quantity.Series;
import earward.block.setting.Setting;
import earward.block.setting.SettingValue;
import earward.kit.path.PlacedBlock;
import earward.kit.review.Remedy;
import earward.kit.review.ReviewedKit;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.stream.Stream;

/**
 * Looks for what clears one finding: first where the block's own check points, then among all
 * values of the other blocks those that move the figure most.
 */
final class RemedySearch {
  /** Of the values of other blocks, so many are walked through. */
  private static final int MOST_ELSEWHERE = 2;

  /** Share of the figure by which one step of a value must move it to be walked. */
  private static final double LEAST_GAIN = 1e-4;

  private final Bench bench;
  private final Finding finding;
  private final List<Proven> proven = new ArrayList<>();

  /** An edit with the review that proves it. */
  private record Proven(Edit edit, ReviewedKit after) {}

  RemedySearch(Bench bench, Finding finding) {
    this.bench = bench;
    this.finding = finding;
  }

  List<Remedy> remedies() {
    if (finding.measured().isEmpty()) {
      return List.of();
    }
    Measured measured = finding.measured().get();
    Relation relation = measured.value() > measured.limit() ? Relation.AT_MOST : Relation.AT_LEAST;
    Optional<PlacedBlock> own = bench.assembly().block(finding.subject());
    own.ifPresent(block -> hints(block).forEach(hint -> follow(block, hint, measured, relation)));
    elsewhere(measured, relation);
    RemedyWords words = new RemedyWords(bench, measured);
    return proven.stream()
        .sorted(Comparator.comparing(each -> bench.added(each.after()).size()))
        .map(each -> words.remedy(each.edit(), each.after()))
        .toList();
  }

  private List<RemedyHint> hints(PlacedBlock block) {
    return block.description().checks().stream()
        .filter(check -> check.code().equals(finding.code()))
        .map(Check::remedies)
        .flatMap(List::stream)
        .toList();
  }

  private void follow(PlacedBlock block, RemedyHint hint, Measured measured, Relation relation) {
    for (Setting setting : block.type().settings()) {
      if (!setting.id().equals(hint.settingId())) {
        continue;
      }
      if (setting instanceof Setting.Value value && hint.direction() != Direction.OTHER) {
        Walk walk = new Walk(bench, block, value, hint.direction(), measured, relation);
        if (walk.gain() != 0) {
          walk.first().ifPresent(this::prove);
        }
      } else {
        others(block, setting).map(other -> new Edit(block, setting, other)).forEach(this::prove);
      }
    }
  }

  /** What else a choice or a part may be. */
  private Stream<SettingValue> others(PlacedBlock block, Setting setting) {
    if (setting instanceof Setting.Choice choice) {
      String now = block.values().choice(setting.id());
      return choice.options().stream()
          .filter(word -> !word.equals(now))
          .map(SettingValue.Option::new);
    }
    if (setting instanceof Setting.Part part) {
      PartKind kind = part.kind();
      return bench.library().names(kind).stream()
          .flatMap(name -> bench.library().find(kind, name).stream())
          .map(entry -> new SettingValue.Chosen(entry.model()))
          .filter(chosen -> !chosen.equals(block.values().all().get(setting.id())))
          .map(chosen -> chosen);
    }
    return Stream.empty();
  }

  /** One step either way of every value that comes in a series; the strongest are walked. */
  private void elsewhere(Measured measured, Relation relation) {
    record Lever(Walk walk, double gain) {}
    List<Lever> levers = new ArrayList<>();
    for (PlacedBlock block : bench.assembly().blocks()) {
      if (block.id().equals(finding.subject())) {
        continue;
      }
      for (Setting setting : block.type().settings()) {
        if (setting instanceof Setting.Value value && value.series() != Series.ANY) {
          for (Direction way : List.of(Direction.UP, Direction.DOWN)) {
            Walk walk = new Walk(bench, block, value, way, measured, relation);
            levers.add(new Lever(walk, walk.gain()));
          }
        }
      }
    }
    levers.stream()
        .filter(lever -> lever.gain() > LEAST_GAIN)
        .sorted(Comparator.comparingDouble(Lever::gain).reversed())
        .limit(MOST_ELSEWHERE)
        .forEach(lever -> lever.walk().first().ifPresent(this::prove));
  }

  private void prove(Edit edit) {
    bench
        .proof(edit.of(bench.design()), finding)
        .ifPresent(after -> proven.add(new Proven(edit, after)));
  }
}
