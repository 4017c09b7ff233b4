package earward.desktop.model;

import earward.kit.design.KitDesign;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/** All forms of a design: of its blocks, and of what is the kit's own. */
public final class Forms {
  private final Workshop workshop;
  private final Form blocks;
  private final Map<String, Form> own;

  /** The forms of a workshop's designs. */
  Forms(Workshop workshop) {
    this.workshop = workshop;
    blocks = new BlockForm(workshop);
    own =
        Map.of(
            Selection.CONDITIONS, new ConditionsForm(),
            Selection.TOLERANCES, new TolerancesForm(),
            Selection.BENCH, new BenchForm(),
            Selection.SHEET, new SheetForm());
  }

  private Form form(String owner) {
    return own.getOrDefault(owner, blocks);
  }

  /** The lines of what is selected; none of a seam or of a block whose type is missing. */
  public List<FormRow> rows(KitDesign design, String owner) {
    Form form = form(owner);
    return form instanceof BlockForm of ? of.rows(design, owner) : form.rows(design);
  }

  /** What the form is called. */
  public String title(KitDesign design, String owner) {
    if (Selection.own(owner)) {
      return Words.of("form" + owner.replace('#', '.'));
    }
    return design
        .block(owner)
        .map(
            block ->
                workshop
                    .types()
                    .find(block.typeId())
                    .map(type -> Texts.of(type).get("name"))
                    .orElse(block.typeId()))
        .orElse(owner);
  }

  /** What the block or form says of itself; may be empty. */
  public String help(KitDesign design, String owner) {
    if (Selection.own(owner)) {
      return Words.of("form" + owner.replace('#', '.') + ".help");
    }
    return design
        .block(owner)
        .flatMap(block -> workshop.types().find(block.typeId()))
        .flatMap(type -> Texts.of(type).find("help"))
        .orElse("");
  }

  /** What is wrong with words for a line, as one sentence; empty where nothing is. */
  public Optional<String> fault(KitDesign design, FormRow row, String words) {
    return form(row.owner()).fault(design, row, words.strip());
  }

  /** The design with a line changed to words that nothing is wrong with. */
  public KitDesign edited(KitDesign design, FormRow row, String words) {
    return form(row.owner()).edited(design, row, words.strip());
  }

  /** What the units of a bare number may be; empty where it is plain what is meant. */
  public List<String> meanings(FormRow row, String words) {
    return Meanings.of(row, words);
  }

  /** The next words of the preferred series, up or down; the same where there are none. */
  public String stepped(FormRow row, String words, boolean up) {
    return Stepping.stepped(row, words, up);
  }
}
