package earward.kit.file;

import earward.kit.design.SheetOptions;

/** Sheet options of a design, as a JSON object. */
final class SheetForm {
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
}
