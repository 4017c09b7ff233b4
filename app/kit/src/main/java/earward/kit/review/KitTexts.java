package earward.kit.review;

import java.util.Locale;
import java.util.ResourceBundle;

/** The words of the kit's own sentences in one language; English where there is none. */
final class KitTexts {
  private final ResourceBundle words;

  KitTexts(Locale language) {
    words =
        ResourceBundle.getBundle(
            "earward.kit.review.texts",
            language,
            ResourceBundle.Control.getNoFallbackControl(ResourceBundle.Control.FORMAT_PROPERTIES));
  }

  String get(String key) {
    return words.getString(key);
  }
}
