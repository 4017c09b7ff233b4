package earward.kit.file;

import earward.block.device.ToleranceClass;
import earward.block.quantity.Unit;
import earward.kit.design.Tolerances;
import java.util.LinkedHashMap;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;

/** The tolerances of a design, as a JSON object. */
final class TolerancesForm {
  private static final String PARTS = "parts";

  private TolerancesForm() {}

  static String key(ToleranceClass kind) {
    return kind.name().toLowerCase(Locale.ROOT).replace('_', ' ');
  }

  static Tolerances read(MembersReader in) throws DesignFileException {
    Map<ToleranceClass, Double> byClass = new LinkedHashMap<>();
    for (ToleranceClass kind : ToleranceClass.values()) {
      var share = in.quantity(key(kind), Unit.FRACTION);
      if (share.isPresent()) {
        byClass.put(kind, share.getAsDouble());
      }
    }
    Map<String, Double> byPart = new LinkedHashMap<>();
    Optional<MembersReader> parts = in.open(PARTS);
    if (parts.isPresent()) {
      for (String place : parts.get().allScalars().keySet()) {
        byPart.put(place, parts.get().requiredQuantity(place, Unit.FRACTION));
      }
    }
    try {
      return new Tolerances(byClass, byPart, in.written());
    } catch (IllegalArgumentException e) {
      throw in.impossible(e);
    }
  }

  static Json.Members write(Tolerances tolerances) {
    MembersWriter out = new MembersWriter(tolerances.written());
    for (ToleranceClass kind : ToleranceClass.values()) {
      Double share = tolerances.byClass().get(kind);
      if (share == null) {
        out.skip(key(kind));
      } else {
        out.quantity(key(kind), share, Unit.FRACTION);
      }
    }
    MembersWriter parts = new MembersWriter(Kept.inner(tolerances.written(), PARTS));
    Kept.inner(tolerances.written(), PARTS).members().keySet().forEach(parts::skip);
    tolerances.byPart().forEach((place, share) -> parts.quantity(place, share, Unit.FRACTION));
    return out.nested(PARTS, parts.done()).done();
  }
}
