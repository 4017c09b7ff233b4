package earward.block.testkit;

import java.util.ArrayList;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Set;

/** Collects sentences, each once. Not safe for several threads. */
final class Faults {
  private static final int MOST_SENTENCES = 20;

  private final Set<String> sentences = new LinkedHashSet<>();

  void add(String sentence) {
    sentences.add(sentence);
  }

  void addIf(boolean wrong, String sentence) {
    if (wrong) {
      sentences.add(sentence);
    }
  }

  /** The sentences in the order found; of very many the first, and how many more there are. */
  List<String> all() {
    List<String> all = new ArrayList<>(sentences);
    if (all.size() <= MOST_SENTENCES) {
      return all;
    }
    List<String> first = new ArrayList<>(all.subList(0, MOST_SENTENCES));
    first.add("and " + (all.size() - MOST_SENTENCES) + " more like these");
    return first;
  }
}
