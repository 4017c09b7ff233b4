package earward.desktop.model;

import earward.block.quantity.Series;
import earward.block.quantity.Unit;
import earward.kit.design.AsWritten;
import earward.kit.design.Bench;
import earward.kit.design.Bench.Instrument;
import earward.kit.design.KitDesign;
import earward.kit.design.QuantityException;
import earward.kit.design.QuantityText;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/** The instruments that a builder owns: three lines each, and an empty name for one more. */
final class BenchForm implements Form {
  private static final Instrument NEW_ONE = new Instrument("meter", 10e6, 0.01, AsWritten.NEW);

  @Override
  public List<FormRow> rows(KitDesign design) {
    List<FormRow> rows = new ArrayList<>();
    List<Instrument> instruments = design.bench().instruments();
    for (int i = 0; i < instruments.size(); i++) {
      Instrument one = instruments.get(i);
      rows.add(row("name-" + i, "name", i, one.name(), new FormRow.Text()));
      rows.add(number("ohms-" + i, "ohms", i, one.inputOhms(), Unit.OHM));
      rows.add(number("accuracy-" + i, "accuracy", i, one.accuracyFraction(), Unit.FRACTION));
    }
    rows.add(row("name-" + instruments.size(), "more", instruments.size(), "", new FormRow.Text()));
    return rows;
  }

  private static FormRow number(String id, String key, int index, double value, Unit unit) {
    double most = unit == Unit.FRACTION ? 1 : Double.POSITIVE_INFINITY;
    return row(
        id,
        key,
        index,
        QuantityText.exact(value, unit),
        new FormRow.Amount(unit, Series.ANY, 0, most));
  }

  private static FormRow row(String id, String key, int index, String words, FormRow.Input input) {
    return new FormRow(
        Selection.BENCH,
        id,
        Words.of("bench." + key, index + 1),
        Words.of("bench." + key + ".help"),
        words,
        false,
        input,
        false);
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
    String[] key = row.id().split("-");
    int index = Integer.parseInt(key[1]);
    List<Instrument> all = new ArrayList<>(design.bench().instruments());
    Instrument old = index < all.size() ? all.get(index) : NEW_ONE;
    if (key[0].equals("name") && words.isEmpty()) {
      if (index < all.size()) {
        all.remove(index);
      }
      return design.withBench(new Bench(all, design.bench().written()));
    }
    Instrument now =
        switch (key[0]) {
          case "name" ->
              new Instrument(words, old.inputOhms(), old.accuracyFraction(), old.written());
          case "ohms" ->
              new Instrument(
                  old.name(),
                  QuantityText.parse(words, Unit.OHM),
                  old.accuracyFraction(),
                  old.written());
          default ->
              new Instrument(
                  old.name(),
                  old.inputOhms(),
                  QuantityText.parse(words, Unit.FRACTION),
                  old.written());
        };
    if (index < all.size()) {
      all.set(index, now);
    } else {
      all.add(now);
    }
    return design.withBench(new Bench(all, design.bench().written()));
  }
}
