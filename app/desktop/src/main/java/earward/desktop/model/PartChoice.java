package earward.desktop.model;

import earward.block.device.PartKind;
import earward.block.device.PartModel;
import earward.kit.parts.PartEntry;
import earward.kit.parts.PartsLibrary;
import java.lang.reflect.RecordComponent;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;

/**
 * A part as the picker shows it.
 *
 * @param name in the library
 * @param figures its first figures, in words
 * @param note all that is to be said: notes, source, whether from memory
 */
public record PartChoice(String name, String figures, String note) {
  private static final int MOST_FIGURES = 4;

  /** The parts of a kind, in the order of the library. */
  public static List<PartChoice> of(PartsLibrary library, PartKind kind) {
    return library.names(kind).stream()
        .flatMap(name -> library.find(kind, name).stream())
        .map(PartChoice::of)
        .toList();
  }

  private static PartChoice of(PartEntry entry) {
    List<String> notes = new ArrayList<>(entry.notes());
    entry.fit().ifPresent(fit -> notes.add(fit.sentence()));
    notes.add(Words.of("part.source", entry.source()));
    return new PartChoice(entry.model().name(), figures(entry.model()), String.join(" ", notes));
  }

  /** The figures of a model by their own names: they are the words of the trade. */
  private static String figures(PartModel model) {
    List<String> figures = new ArrayList<>();
    for (RecordComponent component : model.getClass().getRecordComponents()) {
      if (component.getType() == double.class && figures.size() < MOST_FIGURES) {
        figures.add(words(component.getName()) + " " + number(figure(model, component)));
      }
    }
    return String.join(", ", figures);
  }

  private static double figure(PartModel model, RecordComponent component) {
    try {
      return (double) component.getAccessor().invoke(model);
    } catch (ReflectiveOperationException e) {
      return Double.NaN; // a figure that cannot be read is shown as a dash
    }
  }

  /** {@code saturationAmperes} as people read it. */
  private static String words(String camel) {
    return camel.replaceAll("([a-z])([A-Z])", "$1 $2").toLowerCase(Locale.ROOT);
  }

  private static String number(double value) {
    return Amounts.of(value, earward.block.quantity.Unit.NUMBER);
  }

  /** Whether all the words that were typed occur in it. */
  public boolean matches(String typed) {
    String all = (name + " " + figures + " " + note).toLowerCase(Words.locale());
    for (String word : typed.toLowerCase(Words.locale()).strip().split("\\s+")) {
      if (!all.contains(word)) {
        return false;
      }
    }
    return true;
  }
}
