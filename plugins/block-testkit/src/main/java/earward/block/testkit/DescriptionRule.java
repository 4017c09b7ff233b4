package earward.block.testkit;

import earward.block.BlockDescription;
import earward.block.BlockType;
import earward.block.setting.Setting;
import java.lang.reflect.Modifier;
import java.util.HashSet;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.Set;

/**
 * The block has a sound id and settings, and describes itself for all of them, the same each time.
 */
public final class DescriptionRule implements BlockRule {
  @Override
  public List<String> faults(BlockType type, List<Variation> variations) {
    Faults faults = new Faults();
    faults.addIf(
        !type.id().matches("[a-z]+(-[a-z]+)*\\.[a-z0-9]+(-[a-z0-9]+)*"),
        "'" + type.id() + "' is no block type id; wanted like filter.treble-shelf, in lower case");
    hasPlainConstructor(type, faults);
    settings(type, faults);
    Set<String> turned = new HashSet<>();
    for (Variation variation : variations) {
      describe(type, variation, faults).ifPresent(description -> parts(description, turned));
    }
    for (Setting setting : type.settings()) {
      String partId = turnedBy(setting);
      faults.addIf(
          !partId.isEmpty() && !turned.contains(partId),
          "setting '"
              + setting.id()
              + "' turns '"
              + partId
              + "', which is a part in no variation; name the id"
              + " of the potentiometer");
    }
    return faults.all();
  }

  private static String turnedBy(Setting setting) {
    if (setting instanceof Setting.Position position) {
      return position.partId();
    }
    return setting instanceof Setting.Trim trim ? trim.partId() : "";
  }

  private static void parts(BlockDescription description, Set<String> ids) {
    description.wiring().parts().forEach(part -> ids.add(part.id()));
  }

  private static void hasPlainConstructor(BlockType type, Faults faults) {
    boolean plain =
        List.of(type.getClass().getConstructors()).stream()
            .anyMatch(constructor -> constructor.getParameterCount() == 0);
    faults.addIf(
        !plain || !Modifier.isPublic(type.getClass().getModifiers()),
        type.getClass().getName()
            + " cannot be made by a program: make the class public, with a public constructor"
            + " without arguments");
  }

  private static void settings(BlockType type, Faults faults) {
    Set<String> ids = new HashSet<>();
    for (Setting setting : type.settings()) {
      faults.addIf(!ids.add(setting.id()), "two settings are named '" + setting.id() + "'");
      faults.addIf(
          !setting.id().equals(setting.id().toLowerCase(Locale.ROOT)),
          "setting '" + setting.id() + "' is not in lower case");
      if (setting instanceof Setting.Part part) {
        List<String> names = LibraryNames.of(part.kind());
        faults.addIf(
            !names.contains(part.usual()),
            "setting '"
                + (part.id() + "' has the usual part '" + part.usual())
                + ("', which the parts library does not have as a " + part.kind().key())
                + ("; there are " + names));
      }
    }
  }

  private static Optional<BlockDescription> describe(
      BlockType type, Variation variation, Faults faults) {
    try {
      BlockDescription first = variation.describe(type);
      if (!first.equals(variation.describe(type))) {
        faults.addIn(
            variation,
            "two descriptions of the same settings differ; use nothing but the values and"
                + " conditions");
      }
      return Optional.of(first);
    } catch (RuntimeException e) {
      faults.addIn(
          variation,
          "not described " + e.getClass() + Shown.place(type, e),
          "it cannot be described with "
              + (Shown.settings(type, variation.values()) + ": " + Shown.thrown(type, e))
              + "; narrow the limits of its settings, or say in goTogether what does not go");
      return Optional.empty();
    }
  }
}
