package earward.block.testkit;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;

/**
 * Collects sentences, each once, with the variations that have the fault. Not safe for several
 * threads.
 */
final class Faults {
  private static final int MOST_SENTENCES = 20;

  private final Map<String, Found> byKind = new LinkedHashMap<>();

  /** A fault as it was first met, and all variations in which it was. */
  private record Found(String sentence, Set<String> variations) {
    String said() {
      if (variations.isEmpty()) {
        return sentence;
      }
      int others = variations.size() - 1;
      String first = " (with " + variations.iterator().next();
      return sentence
          + (others == 0
              ? first + ")"
              : first + ", and in " + others + (others == 1 ? " other" : " others") + ")");
    }
  }

  void add(String sentence) {
    byKind.computeIfAbsent(sentence, kind -> new Found(sentence, new LinkedHashSet<>()));
  }

  void addIf(boolean wrong, String sentence) {
    if (wrong) {
      add(sentence);
    }
  }

  /** A fault of a variation, said once however many variations have it. */
  void addIn(Variation variation, String sentence) {
    addIn(variation, sentence, sentence);
  }

  /**
   * The same where the sentence carries numbers of the variation.
   *
   * @param kind what is the same in all variations that have the fault
   */
  void addIn(Variation variation, String kind, String sentence) {
    byKind
        .computeIfAbsent(kind, any -> new Found(sentence, new LinkedHashSet<>()))
        .variations()
        .add(variation.name());
  }

  /** The sentences in the order found; of very many the first, and how many more there are. */
  List<String> all() {
    List<String> all = byKind.values().stream().map(Found::said).toList();
    if (all.size() <= MOST_SENTENCES) {
      return all;
    }
    List<String> first = new ArrayList<>(all.subList(0, MOST_SENTENCES));
    first.add("and " + (all.size() - MOST_SENTENCES) + " more like these");
    return first;
  }
}
