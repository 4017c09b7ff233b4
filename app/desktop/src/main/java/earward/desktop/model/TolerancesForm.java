package earward.desktop.model;

import earward.block.device.ToleranceClass;
import earward.block.quantity.Series;
import earward.block.quantity.Unit;
import earward.kit.design.KitDesign;
import earward.kit.design.QuantityException;
import earward.kit.design.QuantityText;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;

/** By how much the parts of one kit differ from those of the next, class by class. */
final class TolerancesForm implements Form {
  @Override
  public List<FormRow> rows(KitDesign design) {
    List<FormRow> rows = new ArrayList<>();
    for (ToleranceClass kind : ToleranceClass.values()) {
      if (kind != ToleranceClass.FIXED) {
        String id = kind.name().toLowerCase(Locale.ROOT).replace('_', '-');
        rows.add(
            new FormRow(
                Selection.TOLERANCES,
                id,
                Words.of("tolerance." + id),
                Words.of("tolerance.help"),
                QuantityText.exact(design.tolerances().fraction(kind), Unit.FRACTION),
                !design.tolerances().byClass().containsKey(kind),
                new FormRow.Amount(Unit.FRACTION, Series.ANY, 0, 1),
                false));
      }
    }
    return rows;
  }

  @Override
  public Optional<String> fault(KitDesign design, FormRow row, String words) {
    try {
      var unused = changed(design, row, words);
      return Optional.empty();
    } catch (QuantityException e) {
      return Optional.of(Words.of("form.fault", row.label(), e.sentence()));
    } catch (IllegalArgumentException e) {
      return Optional.of(Words.of("form.fault", row.label(), String.valueOf(e.getMessage())));
    }
  }

  @Override
  public KitDesign edited(KitDesign design, FormRow row, String words) {
    try {
      return words.equals(row.words()) ? design : changed(design, row, words);
    } catch (QuantityException e) {
      throw new IllegalArgumentException(e.sentence(), e);
    }
  }

  private static KitDesign changed(KitDesign design, FormRow row, String words)
      throws QuantityException {
    ToleranceClass kind =
        ToleranceClass.valueOf(row.id().toUpperCase(Locale.ROOT).replace('-', '_'));
    double share = QuantityText.parse(words, Unit.FRACTION);
    return design.withTolerances(design.tolerances().with(kind, share));
  }
}
