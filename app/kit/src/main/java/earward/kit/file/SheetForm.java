package earward.kit.file;

import earward.block.quantity.Unit;
import earward.kit.design.Bench;
import earward.kit.design.SheetOptions;
import java.util.ArrayList;
import java.util.List;

/** Sheet options and bench of a design, as JSON objects. */
final class SheetForm {
  private static final String INSTRUMENTS = "instruments";

  private SheetForm() {}

  static SheetOptions readSheet(MembersReader in) throws DesignFileException {
    SheetOptions usual = SheetOptions.USUAL;
    try {
      return new SheetOptions(
          in.choice(
              "paper", SheetOptions.Paper.values(), SheetOptions.Paper::key, SheetOptions.Paper.A4),
          in.text("language").orElse(usual.language()),
          in.text("club").orElse(usual.clubName()),
          in.text("kit number").orElse(usual.kitNumber()),
          in.choice(
              "drawing",
              SheetOptions.Density.values(),
              SheetOptions.Density::key,
              SheetOptions.Density.ROOMY),
          in.written());
    } catch (IllegalArgumentException e) {
      throw in.impossible(e);
    }
  }

  static Json.Members writeSheet(SheetOptions sheet) {
    SheetOptions usual = SheetOptions.USUAL;
    return new MembersWriter(sheet.written())
        .text("paper", sheet.paper().key(), usual.paper().key())
        .text("language", sheet.language(), usual.language())
        .text("club", sheet.clubName(), usual.clubName())
        .text("kit number", sheet.kitNumber(), usual.kitNumber())
        .text("drawing", sheet.density().key(), usual.density().key())
        .done();
  }

  static Bench readBench(MembersReader in) throws DesignFileException {
    List<Bench.Instrument> instruments = new ArrayList<>();
    for (Json item : in.ownItems(INSTRUMENTS)) {
      MembersReader one = MembersReader.of(item, in.source(), "an instrument");
      try {
        instruments.add(
            new Bench.Instrument(
                one.requiredText("name"),
                one.requiredQuantity("input resistance", Unit.OHM),
                one.requiredQuantity("accuracy", Unit.FRACTION),
                one.written()));
      } catch (IllegalArgumentException e) {
        throw one.impossible(e);
      }
    }
    return new Bench(instruments, in.written());
  }

  static Json.Members writeBench(Bench bench) {
    return new MembersWriter(bench.written())
        .nested(
            INSTRUMENTS,
            Json.array(bench.instruments().stream().map(SheetForm::instrument).toList()))
        .done();
  }

  private static Json instrument(Bench.Instrument instrument) {
    return new MembersWriter(instrument.written())
        .text("name", instrument.name())
        .quantity("input resistance", instrument.inputOhms(), Unit.OHM)
        .quantity("accuracy", instrument.accuracyFraction(), Unit.FRACTION)
        .done();
  }
}
