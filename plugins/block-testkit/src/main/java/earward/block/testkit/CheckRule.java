package earward.block.testkit;

import earward.block.BlockDescription;
import earward.block.BlockType;
import earward.block.Curve;
import earward.block.check.Check;
import earward.block.check.RemedyHint;
import earward.block.figure.FigureName;
import earward.block.quantity.Unit;
import earward.block.setting.Setting;
import java.util.HashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;

/** Checks and curves speak of figures and settings that the block has. */
public final class CheckRule implements BlockRule {
  @Override
  public List<String> faults(BlockType type, List<Variation> variations) {
    Faults faults = new Faults();
    for (Variation variation : variations) {
      variation.attempt(type).ifPresent(description -> of(description, type, faults));
    }
    return faults.all();
  }

  private static void of(BlockDescription description, BlockType type, Faults faults) {
    FigurePlaces places = new FigurePlaces(description.wiring());
    Set<String> codes = new HashSet<>();
    for (Check check : description.checks()) {
      String name = "check " + check.code();
      faults.addIf(
          !codes.add(check.code() + " of " + check.figure() + " " + check.relation()),
          name + " of " + check.figure() + " is there twice; leave one out");
      faults.addIf(
          Double.isInfinite(check.limit()),
          name + " has an infinite limit; where nothing is wanted, leave it out");
      figure(name, check.figure(), places, faults);
      check.remedies().forEach(hint -> remedy(name, hint, type, faults));
    }
    Set<String> ids = new HashSet<>();
    for (Curve curve : description.curves()) {
      faults.addIf(!ids.add(curve.id()), "two curves are named '" + curve.id() + "'");
      sweep(curve, type, faults);
      curve.figures().forEach(f -> figure("curve " + curve.id(), f, places, faults));
    }
  }

  private static void figure(String name, FigureName figure, FigurePlaces places, Faults faults) {
    places
        .whyNot(figure)
        .ifPresent(
            why -> faults.add(name + ": the block has no " + figure.quantity().key() + " " + why));
  }

  private static void remedy(String name, RemedyHint hint, BlockType type, Faults faults) {
    Optional<Setting> setting = setting(type, hint.settingId());
    if (setting.isEmpty()) {
      faults.add(
          name + " would turn '" + hint.settingId() + "'; wanted one of " + settingIds(type));
      return;
    }
    boolean steps = setting.get() instanceof Setting.Value;
    boolean other = hint.direction() == RemedyHint.Direction.OTHER;
    faults.addIf(
        other == steps,
        name
            + (" would " + verb(hint.direction()) + " setting '" + hint.settingId() + "'; ")
            + "a value is raised or lowered, a choice or a part is changed");
  }

  private static String verb(RemedyHint.Direction direction) {
    return switch (direction) {
      case UP -> "raise";
      case DOWN -> "lower";
      case OTHER -> "change";
    };
  }

  private static void sweep(Curve curve, BlockType type, Faults faults) {
    String name = "curve " + curve.id();
    Optional<Setting> setting = setting(type, curve.settingId());
    Unit unit = Unit.NUMBER;
    double least;
    double most;
    if (setting.isPresent() && setting.get() instanceof Setting.Value value) {
      unit = value.unit();
      least = value.least();
      most = value.most();
    } else if (setting.isPresent() && setting.get() instanceof Setting.Position) {
      least = 0;
      most = 1;
    } else {
      faults.add(
          name + " sweeps '" + curve.settingId() + "'; wanted a value or a position of the block");
      return;
    }
    faults.addIf(
        curve.from() < least || curve.to() > most,
        name
            + (" runs from " + Shown.quantity(curve.from(), unit))
            + (" to " + Shown.quantity(curve.to(), unit) + "; setting '")
            + (curve.settingId() + "' goes from " + Shown.quantity(least, unit))
            + (" to " + Shown.quantity(most, unit)));
  }

  private static Optional<Setting> setting(BlockType type, String id) {
    return type.settings().stream().filter(s -> s.id().equals(id)).findFirst();
  }

  private static List<String> settingIds(BlockType type) {
    return type.settings().stream().map(Setting::id).toList();
  }
}
