package earward.desktop.model;

import java.util.Locale;
import java.util.ResourceBundle;

/** The words of the window, all in one place: {@code words.properties}. */
public final class Words {
  private static final ResourceBundle ALL =
      ResourceBundle.getBundle("earward.desktop.words", Locale.ENGLISH);

  private Words() {}

  /** The language of the words. */
  public static Locale locale() {
    return Locale.ENGLISH;
  }

  /** Whether there is a text of this key. */
  public static boolean has(String key) {
    return ALL.containsKey(key);
  }

  /** The text of a key, with {0}, {1} … replaced. */
  public static String of(String key, Object... arguments) {
    String text = ALL.getString(key);
    for (int i = 0; i < arguments.length; i++) {
      text = text.replace("{" + i + "}", String.valueOf(arguments[i]));
    }
    return text;
  }
}
