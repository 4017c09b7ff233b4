package earward.desktop.model;

import earward.block.quantity.Series;
import earward.block.quantity.Unit;
import earward.kit.design.FrontEndSupply;
import earward.kit.design.KitConditions;
import earward.kit.design.KitDesign;
import earward.kit.design.QuantityException;
import earward.kit.design.QuantityText;
import earward.kit.design.WantedLimits;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

/** What the kit is called, what it must work under and what is wanted of it. */
final class ConditionsForm implements Form {
  private static final String TITLE = "title";
  private static final String REVISION = "revision";
  private static final String FRONT_END = "front-end";
  private static final String HOURS = "battery-hours";

  /** The wishes beyond safety. */
  private enum Wish {
    LOW_EDGE("low-edge", Unit.HERTZ),
    LISTENING("listening-watts", Unit.WATT),
    DISTORTION("distortion", Unit.FRACTION),
    DISTANCE("listening-metres", Unit.METRE);

    private final String key;
    private final Unit unit;

    Wish(String key, Unit unit) {
      this.key = key;
      this.unit = unit;
    }

    double of(WantedLimits wanted) {
      return switch (this) {
        case LOW_EDGE -> wanted.lowEdgeHertz();
        case LISTENING -> wanted.listeningWatts();
        case DISTORTION -> wanted.distortion();
        case DISTANCE -> wanted.listeningMetres();
      };
    }

    WantedLimits in(WantedLimits wanted, double value) {
      return new WantedLimits(
          this == LOW_EDGE ? value : wanted.lowEdgeHertz(),
          this == LISTENING ? value : wanted.listeningWatts(),
          wanted.batteryHours(),
          this == DISTORTION ? value : wanted.distortion(),
          wanted.curve(),
          this == DISTANCE ? value : wanted.listeningMetres());
    }
  }

  @Override
  public List<FormRow> rows(KitDesign design) {
    KitConditions conditions = design.conditions();
    List<FormRow> rows = new ArrayList<>();
    rows.add(row(TITLE, design.title(), new FormRow.Text()));
    rows.add(row(REVISION, design.revision(), new FormRow.Text()));
    List<String> answers = Arrays.stream(FrontEndSupply.values()).map(FrontEndSupply::key).toList();
    rows.add(
        row(
            FRONT_END,
            conditions.frontEndSupply().key(),
            new FormRow.Choice(
                answers, answers.stream().map(a -> Words.of("front-end." + key(a))).toList())));
    for (ConditionValue value : ConditionValue.values()) {
      rows.add(number(value.key(), value.of(conditions.core()), value.unit()));
    }
    for (Wish wish : Wish.values()) {
      rows.add(number(wish.key, wish.of(conditions.wanted()), wish.unit));
    }
    OptionalDouble hours = conditions.wanted().batteryHours();
    rows.add(
        row(
            HOURS,
            hours.isPresent() ? QuantityText.exact(hours.getAsDouble(), Unit.HOUR) : "",
            new FormRow.Text()));
    return rows;
  }

  private static String key(String answer) {
    return answer.replace(' ', '-');
  }

  private static FormRow number(String id, double value, Unit unit) {
    return row(
        id,
        QuantityText.exact(value, unit),
        new FormRow.Amount(unit, Series.ANY, Double.NEGATIVE_INFINITY, Double.POSITIVE_INFINITY));
  }

  private static FormRow row(String id, String words, FormRow.Input input) {
    return new FormRow(
        Selection.CONDITIONS,
        id,
        Words.of("condition." + id),
        Words.of("condition." + id + ".help"),
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
      return changed(design, row, words);
    } catch (QuantityException e) {
      throw new IllegalArgumentException(e.sentence(), e);
    }
  }

  private static KitDesign changed(KitDesign design, FormRow row, String words)
      throws QuantityException {
    KitConditions conditions = design.conditions();
    if (row.id().equals(TITLE)) {
      return design.withTitle(words);
    } else if (row.id().equals(REVISION)) {
      return design.withRevision(words);
    } else if (row.id().equals(FRONT_END)) {
      for (FrontEndSupply answer : FrontEndSupply.values()) {
        if (answer.key().equals(words)) {
          return design.withConditions(conditions.withFrontEndSupply(answer));
        }
      }
      return design;
    } else if (row.id().equals(HOURS)) {
      return design.withConditions(conditions.withWanted(hours(conditions.wanted(), words)));
    }
    for (ConditionValue value : ConditionValue.values()) {
      if (value.key().equals(row.id())) {
        double number = QuantityText.parse(words, value.unit());
        return number == value.of(conditions.core())
            ? design
            : design.withConditions(conditions.withCore(value.in(conditions.core(), number)));
      }
    }
    for (Wish wish : Wish.values()) {
      if (wish.key.equals(row.id())) {
        double number = QuantityText.parse(words, wish.unit);
        return design.withConditions(conditions.withWanted(wish.in(conditions.wanted(), number)));
      }
    }
    return design;
  }

  private static WantedLimits hours(WantedLimits wanted, String words) throws QuantityException {
    return new WantedLimits(
        wanted.lowEdgeHertz(),
        wanted.listeningWatts(),
        words.isEmpty()
            ? OptionalDouble.empty()
            : OptionalDouble.of(QuantityText.parse(words, Unit.HOUR)),
        wanted.distortion(),
        wanted.curve(),
        wanted.listeningMetres());
  }
}
