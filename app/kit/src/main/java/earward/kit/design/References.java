package earward.kit.design;

import java.util.Collections;
import java.util.HashMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import java.util.Optional;

/**
 * The references of parts and test points, given once and stored. What a design no longer has keeps
 * its reference, so that it comes back under the same one.
 *
 * @param parts by place {@code volume.track}, for instance RV1
 * @param testPoints by place {@code volume.wiper}, for instance TP3
 * @param written how the file had it
 */
public record References(
    Map<String, String> parts, Map<String, String> testPoints, AsWritten written) {
  /** No references yet. */
  public static final References NONE = new References(Map.of(), Map.of(), AsWritten.NEW);

  /**
   * A part that needs a reference.
   *
   * @param place {@code block.part}
   * @param letters for instance R; see {@link ReferenceLetters}
   */
  public record Needed(String place, String letters) {}

  public References {
    parts = Collections.unmodifiableMap(new LinkedHashMap<>(parts));
    testPoints = Collections.unmodifiableMap(new LinkedHashMap<>(testPoints));
    Objects.requireNonNull(written);
    requireUnique(parts, testPoints);
  }

  private static void requireUnique(Map<String, String> parts, Map<String, String> testPoints) {
    Map<String, String> placeOf = new HashMap<>();
    parts.forEach((place, reference) -> requireNew(placeOf, place, reference));
    testPoints.forEach((place, reference) -> requireNew(placeOf, place, reference));
  }

  private static void requireNew(Map<String, String> placeOf, String place, String reference) {
    if (!reference.matches("[A-Za-z]+[0-9]{1,6}")) {
      throw new IllegalArgumentException(
          "the reference of '" + place + "' is '" + reference + "'; wanted letters and a number");
    }
    String former = placeOf.put(reference, place);
    if (former != null) {
      throw new IllegalArgumentException(
          "reference " + reference + " is given twice, to '" + former + "' and '" + place + "'");
    }
  }

  /** The reference of a part. */
  public Optional<String> ofPart(String place) {
    return Optional.ofNullable(parts.get(place));
  }

  /** The reference of a test point. */
  public Optional<String> ofTestPoint(String place) {
    return Optional.ofNullable(testPoints.get(place));
  }

  /**
   * These references, with new ones for what has none yet: the next number above the highest in use
   * with the same letters. Nothing is renumbered.
   *
   * @param neededParts in fitting order
   * @param neededTestPoints in the order of the path
   */
  public References completed(List<Needed> neededParts, List<String> neededTestPoints) {
    Map<String, Integer> highest = new HashMap<>();
    parts.values().forEach(reference -> note(highest, reference));
    testPoints.values().forEach(reference -> note(highest, reference));
    Map<String, String> moreParts = new LinkedHashMap<>(parts);
    for (Needed needed : neededParts) {
      moreParts.computeIfAbsent(needed.place(), place -> next(highest, needed.letters()));
    }
    Map<String, String> moreTestPoints = new LinkedHashMap<>(testPoints);
    for (String needed : neededTestPoints) {
      moreTestPoints.computeIfAbsent(needed, place -> next(highest, ReferenceLetters.TEST_POINT));
    }
    return new References(moreParts, moreTestPoints, written);
  }

  /** All references anew, from 1 in the given order; what is not named loses its reference. */
  public References renumbered(List<Needed> neededParts, List<String> neededTestPoints) {
    return new References(Map.of(), Map.of(), written).completed(neededParts, neededTestPoints);
  }

  private static void note(Map<String, Integer> highest, String reference) {
    String letters = reference.replaceAll("[0-9]", "");
    int number = Integer.parseInt(reference.substring(letters.length()));
    highest.merge(letters, number, Math::max);
  }

  private static String next(Map<String, Integer> highest, String letters) {
    return letters + highest.merge(letters, 1, Integer::sum);
  }
}
