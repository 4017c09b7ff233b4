package earward.kit.proposal;

import earward.block.BlockType;
import earward.block.Role;
import earward.block.SeamUse;
import earward.block.device.Potentiometer;
import earward.block.figure.CaseName;
import earward.block.figure.FigureName;
import earward.block.figure.Quantity;
import earward.block.quantity.Series;
import earward.block.quantity.Unit;
import earward.block.setting.Setting;
import earward.block.setting.SettingValue;
import earward.block.wiring.WiredPart;
import earward.kit.design.BlockEntry;
import earward.kit.design.KitDesign;
import earward.kit.path.Assembler;
import earward.kit.path.Assembly;
import earward.kit.path.PlacedBlock;
import earward.kit.proposal.MatchingAction.Kind;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Locale;
import java.util.Optional;

/** Finds and tries what could be done at one seam. Used once. */
final class SeamActions {
  /** Losses that are tried, dB. */
  private static final List<Double> LOSSES = List.of(3.0, 6.0, 12.0);

  /** How far below the lowest tone a coupling capacitor's corner lies (common practice). */
  private static final double BELOW_LOWEST_TONE = 2;

  /** Steps of the series by which another track is larger or smaller: a half, two and so on. */
  private static final List<Integer> TRACK_STEPS = List.of(-4, -2, 2, 4);

  private final Bench bench;
  private final String into;
  private final int index;
  private final double onward;
  private final double backward;

  SeamActions(Bench bench, String into) {
    this.bench = bench;
    this.into = into;
    this.index = index();
    onward = ohms(Quantity.ONWARD_OHMS);
    backward = ohms(Quantity.BACKWARD_OHMS);
  }

  /** Where in the path the seam is: what is put there takes this index. */
  private int index() {
    List<PlacedBlock> path = bench.assembly().path();
    List<String> seams = new ArrayList<>();
    boolean audio = false;
    for (PlacedBlock block : path) {
      if (audio && block.type().role() != Role.LOAD) {
        seams.add(block.id());
      }
      audio |= block.type().role() == Role.DETECTOR;
    }
    if (!seams.contains(into)) {
      throw new IllegalArgumentException(
          "There is no seam into '"
              + into
              + "' between detector and load; there are those into "
              + String.join(", ", seams)
              + ".");
    }
    return path.stream().map(PlacedBlock::id).toList().indexOf(into);
  }

  private double ohms(Quantity quantity) {
    return bench.now().figures().orNaN(new FigureName("seam." + into, quantity, CaseName.TEST));
  }

  List<MatchingAction> all() {
    List<MatchingAction> actions = new ArrayList<>();
    for (BlockType type : bench.types().all()) {
      for (SeamUse use : type.seamUses()) {
        for (List<Double> values : values(use)) {
          put(type, use, values).ifPresent(actions::add);
        }
      }
    }
    tracks(actions);
    return actions.stream()
        .sorted(Comparator.comparingInt(action -> action.raised().size() - action.cleared().size()))
        .toList();
  }

  /** The values to try for what a use leaves open, by the impedances at the seam. */
  private List<List<Double>> values(SeamUse use) {
    if (use.kind() == SeamUse.Kind.BUFFER) {
      return List.of(List.of());
    }
    if (use.kind() == SeamUse.Kind.COUPLING_CAPACITOR) {
      double lowest = bench.design().conditions().core().lowestToneHertz() / BELOW_LOWEST_TONE;
      double least = 1 / (2 * Math.PI * lowest * (onward + backward));
      return List.of(List.of(Series.E6.next(least)));
    }
    return LOSSES.stream().map(decibels -> resistors(use.kind(), decibels)).toList();
  }

  /**
   * Resistors for a loss between the two resistances of the seam (voltage divider; the pad is an L
   * that keeps the load of what stands before).
   */
  private List<Double> resistors(SeamUse.Kind kind, double decibels) {
    double ratio = Math.pow(10, decibels / 20);
    double both = onward * backward / (onward + backward);
    return switch (kind) {
      case SERIES_RESISTOR -> List.of((onward + backward) * (ratio - 1));
      case SHUNT_RESISTOR -> List.of(both / (ratio - 1));
      default -> List.of(onward * (ratio - 1) / ratio, onward / (ratio - 1));
    };
  }

  private Optional<MatchingAction> put(BlockType type, SeamUse use, List<Double> values) {
    List<String> said = new ArrayList<>();
    BlockEntry entry = BlockEntry.of(newId(use.kind().key()), type.id());
    for (Setting setting : type.settings()) {
      SettingValue fixed = use.settings().get(setting.id());
      int open = use.open().indexOf(setting.id());
      if (open >= 0 && setting instanceof Setting.Value value) {
        double fitted = value.series().nearest(values.get(open));
        if (!(fitted >= value.least() && fitted <= value.most())) {
          return Optional.empty();
        }
        String words = SettingWords.of(setting, new SettingValue.Amount(fitted));
        said.add(words);
        entry = entry.with(setting.id(), words);
      } else if (fixed != null) {
        entry = entry.with(setting.id(), SettingWords.of(setting, fixed));
      }
    }
    String sentence =
        "Put a "
            + use.kind().key().replace('-', ' ')
            + (said.isEmpty() ? "" : " of " + String.join(" and ", said))
            + " ("
            + type.id()
            + ") before '"
            + into
            + "'.";
    Kind kind = Kind.valueOf(use.kind().name());
    return tried(kind, sentence, bench.design().addBlock(index, entry));
  }

  private String newId(String wanted) {
    String id = wanted;
    for (int i = 2; bench.design().block(id).isPresent(); i++) {
      id = wanted + "-" + i;
    }
    return id;
  }

  private Optional<MatchingAction> tried(Kind kind, String sentence, KitDesign edited) {
    return new Trial(bench).of(edited, into).map(after -> action(kind, sentence, after));
  }

  private MatchingAction action(Kind kind, String sentence, Trial.Outcome after) {
    return new MatchingAction(
        kind, sentence, after.design(), after.effects(), after.cleared(), after.raised());
  }

  /** Other tracks of the potentiometers on both sides of the seam. */
  private void tracks(List<MatchingAction> actions) {
    for (PlacedBlock block : bench.assembly().path().subList(Math.max(0, index - 1), index + 1)) {
      for (WiredPart part : block.description().wiring().partsOf(Potentiometer.class)) {
        for (Setting setting : block.type().settings()) {
          if (setting instanceof Setting.Value value
              && value.unit() == Unit.OHM
              && sets(block, value, part)) {
            TRACK_STEPS.forEach(steps -> track(block, value, steps).ifPresent(actions::add));
          }
        }
      }
    }
  }

  private Optional<MatchingAction> track(PlacedBlock block, Setting.Value value, int steps) {
    double now = block.values().amount(value.id());
    double ohms = now;
    for (int i = 0; i < Math.abs(steps); i++) {
      ohms = steps > 0 ? value.series().next(ohms) : value.series().previous(ohms);
    }
    if (ohms < value.least() || ohms > value.most()) {
      return Optional.empty();
    }
    Edit edit = new Edit(block, value, new SettingValue.Amount(ohms));
    String sentence =
        String.format(
            Locale.ROOT,
            "Take a track of %s in place of %s in '%s'.",
            SettingWords.of(value, new SettingValue.Amount(ohms)),
            SettingWords.of(value, new SettingValue.Amount(now)),
            block.id());
    return tried(Kind.OTHER_TRACK, sentence, edit.of(bench.design()));
  }

  /** Whether a setting is the resistance of a potentiometer's track. */
  private boolean sets(PlacedBlock block, Setting.Value value, WiredPart part) {
    double now = block.values().amount(value.id());
    Edit edit = new Edit(block, value, new SettingValue.Amount(value.series().next(now)));
    Assembly other = Assembler.assemble(edit.of(bench.design()), bench.types(), bench.library());
    double before = ((Potentiometer) part.device()).trackOhms();
    return other.circuit().parts().stream()
        .filter(each -> each.name().equals(block.partName(part)))
        .anyMatch(each -> ((Potentiometer) each.device()).trackOhms() != before);
  }
}
