package earward.kit.file;

import earward.kit.design.AsWritten;
import earward.kit.design.References;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.Optional;

/** The stored references of a design, as a JSON object. */
final class ReferencesForm {
  private static final String PARTS = "parts";
  private static final String TEST_POINTS = "test points";

  private ReferencesForm() {}

  static References read(MembersReader in) throws DesignFileException {
    Map<String, String> parts = words(in.openOwn(PARTS));
    Map<String, String> testPoints = words(in.openOwn(TEST_POINTS));
    try {
      return new References(parts, testPoints, in.written());
    } catch (IllegalArgumentException e) {
      throw in.impossible(e);
    }
  }

  private static Map<String, String> words(Optional<MembersReader> in) throws DesignFileException {
    Map<String, String> words = new LinkedHashMap<>();
    if (in.isPresent()) {
      in.get().allScalars().forEach((place, reference) -> words.put(place, reference.words()));
    }
    return words;
  }

  static Json.Members write(References references) {
    return new MembersWriter(references.written())
        .nested(PARTS, object(references.parts()))
        .nested(TEST_POINTS, object(references.testPoints()))
        .done();
  }

  private static Json.Members object(Map<String, String> words) {
    MembersWriter out = new MembersWriter(AsWritten.NEW);
    words.forEach(out::text);
    return out.done();
  }
}
