package earward.desktop.model;

import earward.kit.design.KitDesign;
import earward.kit.design.SheetOptions;
import earward.kit.design.SheetOptions.Density;
import earward.kit.design.SheetOptions.Paper;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;

/** How the build sheet is to look. */
final class SheetForm implements Form {
  @Override
  public List<FormRow> rows(KitDesign design) {
    SheetOptions sheet = design.sheet();
    List<String> papers = Arrays.stream(Paper.values()).map(Paper::key).toList();
    List<String> densities = Arrays.stream(Density.values()).map(Density::key).toList();
    return List.of(
        row("paper", sheet.paper().key(), new FormRow.Choice(papers, papers)),
        row(
            "density",
            sheet.density().key(),
            new FormRow.Choice(
                densities, densities.stream().map(d -> Words.of("density." + d)).toList())),
        row("club", sheet.clubName(), new FormRow.Text()),
        row("kit-number", sheet.kitNumber(), new FormRow.Text()),
        row("language", sheet.language(), new FormRow.Text()));
  }

  private static FormRow row(String id, String words, FormRow.Input input) {
    return new FormRow(
        Selection.SHEET,
        id,
        Words.of("sheet-option." + id),
        Words.of("sheet-option." + id + ".help"),
        words,
        false,
        input,
        false);
  }

  @Override
  public Optional<String> fault(KitDesign design, FormRow row, String words) {
    try {
      var unused = edited(design, row, words);
      return Optional.empty();
    } catch (IllegalArgumentException e) {
      return Optional.of(Words.of("form.fault", row.label(), String.valueOf(e.getMessage())));
    }
  }

  @Override
  public KitDesign edited(KitDesign design, FormRow row, String words) {
    SheetOptions was = design.sheet();
    Paper paper =
        Arrays.stream(Paper.values())
            .filter(each -> row.id().equals("paper") && each.key().equals(words))
            .findFirst()
            .orElse(was.paper());
    Density density =
        Arrays.stream(Density.values())
            .filter(each -> row.id().equals("density") && each.key().equals(words))
            .findFirst()
            .orElse(was.density());
    return design.withSheet(
        new SheetOptions(
            paper,
            row.id().equals("language") ? words : was.language(),
            row.id().equals("club") ? words : was.clubName(),
            row.id().equals("kit-number") ? words : was.kitNumber(),
            density,
            was.written()));
  }
}
