package earward.block.testkit;

import earward.block.BlockDescription;
import earward.block.BlockType;
import earward.block.Curve;
import earward.block.check.Check;
import earward.block.check.RemedyHint;
import earward.block.figure.FigureName;
import earward.block.setting.Setting;
import earward.block.wiring.Port;
import earward.block.wiring.Wiring;
import java.util.HashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;

/** Checks and curves speak of places and settings that the block has. */
public final class CheckRule implements BlockRule {
  @Override
  public List<String> faults(BlockType type, List<Variation> variations) {
    Faults faults = new Faults();
    for (Variation variation : variations) {
      BlockDescription description = variation.describe(type);
      Set<String> places = places(description.wiring());
      Set<String> codes = new HashSet<>();
      for (Check check : description.checks()) {
        String name = "check " + check.code();
        faults.addIf(!codes.add(check.code() + check.figure()), name + " is there twice");
        faults.addIf(Double.isInfinite(check.limit()), name + " has no finite limit");
        place(name, check.figure(), places, faults);
        check.remedies().forEach(hint -> remedy(name, hint, type, faults));
      }
      for (Curve curve : description.curves()) {
        curve(curve, type, faults);
        curve.figures().forEach(f -> place("curve " + curve.id(), f, places, faults));
      }
    }
    return faults.all();
  }

  private static Set<String> places(Wiring wiring) {
    Set<String> places = new HashSet<>(Set.of(""));
    for (Optional<Port> port : List.of(wiring.entry(), wiring.exit())) {
      port.ifPresent(p -> places.addAll(p.nodes()));
    }
    wiring.parts().forEach(part -> places.add(part.id()));
    wiring.parts().forEach(part -> places.addAll(part.nodes().values()));
    wiring.testPoints().forEach(point -> places.add(point.id()));
    return places;
  }

  private static void place(String name, FigureName figure, Set<String> places, Faults faults) {
    faults.addIf(
        !places.contains(figure.place()),
        name + " speaks of '" + figure.place() + "', no place of the block");
  }

  private static void remedy(String name, RemedyHint hint, BlockType type, Faults faults) {
    Optional<Setting> setting = setting(type, hint.settingId());
    if (setting.isEmpty()) {
      faults.add(name + " would turn '" + hint.settingId() + "', no setting of the block");
      return;
    }
    boolean steps = setting.get() instanceof Setting.Value;
    faults.addIf(
        (hint.direction() == RemedyHint.Direction.OTHER) == steps,
        name + " would go " + hint.direction() + " with setting '" + hint.settingId() + "'");
  }

  private static void curve(Curve curve, BlockType type, Faults faults) {
    String name = "curve " + curve.id();
    faults.addIf(!(curve.from() < curve.to()), name + " runs from its end to its start");
    Optional<Setting> setting = setting(type, curve.settingId());
    double least;
    double most;
    if (setting.isPresent() && setting.get() instanceof Setting.Value value) {
      least = value.least();
      most = value.most();
    } else if (setting.isPresent() && setting.get() instanceof Setting.Position) {
      least = 0;
      most = 1;
    } else {
      faults.add(name + " sweeps '" + curve.settingId() + "', no value or position of the block");
      return;
    }
    faults.addIf(
        curve.from() < least || curve.to() > most,
        name + " leaves the limits of setting '" + curve.settingId() + "'");
  }

  private static Optional<Setting> setting(BlockType type, String id) {
    return type.settings().stream().filter(s -> s.id().equals(id)).findFirst();
  }
}
