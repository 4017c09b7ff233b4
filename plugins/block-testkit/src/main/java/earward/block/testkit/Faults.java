package earward.block.testkit;

import java.util.ArrayList;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Set;

/** Collects sentences, each once. Not safe for several threads. */
final class Faults {
  private final Set<String> sentences = new LinkedHashSet<>();

  void add(String sentence) {
    sentences.add(sentence);
  }

  void addIf(boolean wrong, String sentence) {
    if (wrong) {
      sentences.add(sentence);
    }
  }

  List<String> all() {
    return new ArrayList<>(sentences);
  }
}
