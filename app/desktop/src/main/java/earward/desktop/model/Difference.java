package earward.desktop.model;

import earward.block.figure.CaseName;
import earward.block.figure.FigureName;
import earward.block.figure.Quantity;
import earward.kit.design.BlockEntry;
import earward.kit.design.KitDesign;
import earward.kit.path.Figures;
import java.util.ArrayList;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Set;

/**
 * One line of a comparison of two designs.
 *
 * @param what a block, a setting of one, a condition, or a figure
 * @param before in the first
 * @param after in the second
 */
public record Difference(String what, String before, String after) {
  private static final List<FigureName> COMPARED =
      List.of(
          path(Quantity.OUTPUT_WATTS, CaseName.TEST),
          path(Quantity.DISTORTION, CaseName.TEST),
          path(Quantity.CLIP_WATTS, CaseName.FULL_OUTPUT),
          path(Quantity.LOW_EDGE_HERTZ, CaseName.TEST),
          path(Quantity.HIGH_EDGE_HERTZ, CaseName.TEST),
          path(Quantity.CLEAN_DEPTH, CaseName.TEST),
          path(Quantity.SIGNAL_TO_NOISE_DECIBELS, CaseName.TEST),
          path(Quantity.SUPPLY_AMPERES, CaseName.NO_SIGNAL),
          path(Quantity.BATTERY_HOURS, new CaseName("listening")));

  private static FigureName path(Quantity quantity, CaseName caseName) {
    return new FigureName("path", quantity, caseName);
  }

  /** What differs in what two designs say. */
  public static List<Difference> ofValues(Forms forms, KitDesign first, KitDesign second) {
    List<Difference> found = new ArrayList<>();
    Set<String> owners = new LinkedHashSet<>();
    owners.add(Selection.CONDITIONS);
    owners.add(Selection.TOLERANCES);
    owners.add(Selection.BENCH);
    owners.add(Selection.SHEET);
    first.blocks().forEach(block -> owners.add(block.id()));
    second.blocks().forEach(block -> owners.add(block.id()));
    for (String owner : owners) {
      String before = type(first, owner);
      String after = type(second, owner);
      if (!before.equals(after)) {
        found.add(new Difference(owner, before, after));
      }
      rows(found, forms, first, second, owner);
    }
    return found;
  }

  private static String type(KitDesign design, String owner) {
    return design.block(owner).map(BlockEntry::typeId).orElse("–");
  }

  private static void rows(
      List<Difference> found, Forms forms, KitDesign first, KitDesign second, String owner) {
    List<FormRow> before = forms.rows(first, owner);
    for (FormRow row : forms.rows(second, owner)) {
      String old =
          before.stream()
              .filter(each -> each.id().equals(row.id()))
              .map(FormRow::words)
              .findFirst()
              .orElse("–");
      if (!old.equals(row.words())) {
        String place = Selection.own(owner) ? forms.title(second, owner) : owner;
        found.add(new Difference(place + ": " + row.label(), old, row.words()));
      }
    }
  }

  /** The watched figures of two designs, side by side. */
  public static List<Difference> ofFigures(Figures first, Figures second) {
    List<Difference> rows = new ArrayList<>();
    for (FigureName name : COMPARED) {
      var unit = name.quantity().unit();
      rows.add(
          new Difference(
              Words.of("figure." + name.quantity().key()),
              Amounts.of(first.orNaN(name), unit),
              Amounts.of(second.orNaN(name), unit)));
    }
    return rows;
  }
}
