package earward.desktop.model;

import earward.kit.design.BlockEntry;
import earward.kit.path.PlacedTestPoint;
import java.util.ArrayList;
import java.util.List;

/**
 * Something that can be found by its name.
 *
 * @param name as it is shown
 * @param kind what it is: a command, a block, a setting, a part, a test point
 * @param extra more words by which it is found
 * @param go what happens when it is chosen
 */
public record Findable(String name, String kind, String extra, Runnable go) {

  /** What a design has that can be found; choosing it selects it. */
  public static List<Findable> of(Workbench bench, java.util.function.Consumer<String> toField) {
    List<Findable> all = new ArrayList<>();
    for (BlockEntry block : bench.design().blocks()) {
      String title = bench.forms().title(bench.design(), block.id());
      all.add(
          new Findable(title, Words.of("find.block"), block.id(), () -> bench.select(block.id())));
      for (FormRow row : bench.forms().rows(bench.design(), block.id())) {
        all.add(
            new Findable(
                row.label() + ": " + row.words(),
                Words.of("find.setting", title),
                row.id(),
                () -> toField.accept(row.name())));
      }
    }
    for (FormRow row : bench.forms().rows(bench.design(), Selection.CONDITIONS)) {
      all.add(
          new Findable(
              row.label() + ": " + row.words(),
              Words.of("form.conditions"),
              row.id(),
              () -> toField.accept(row.name())));
    }
    bench
        .readings()
        .assembly()
        .ifPresent(
            assembly -> {
              for (PartRow part : PartRow.of(assembly)) {
                all.add(
                    new Findable(
                        part.reference() + "  " + part.value(),
                        Words.of("find.part", part.block()),
                        part.what(),
                        () -> toField.accept(bench.settingOf(part.place()))));
              }
              for (PlacedTestPoint point : assembly.testPoints()) {
                all.add(
                    new Findable(
                        point.reference(),
                        Words.of("find.test-point"),
                        point.place(),
                        () -> bench.select(point.place().replaceAll("\\..*", ""))));
              }
            });
    return all;
  }

  /** Whether all the words that were typed occur in it. */
  public boolean matches(String typed) {
    String all = (name + " " + kind + " " + extra).toLowerCase(Words.locale());
    for (String word : typed.toLowerCase(Words.locale()).strip().split("\\s+")) {
      if (!all.contains(word)) {
        return false;
      }
    }
    return true;
  }
}
