package earward.sheet.wording;

import java.io.IOException;
import java.io.InputStream;
import java.io.InputStreamReader;
import java.io.Reader;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.Locale;
import java.util.Properties;
import java.util.Set;
import java.util.TreeSet;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/**
 * The words of the sheet in one language, from {@code templates/sheets/LANGUAGE.properties}; what a
 * language lacks is taken from English. Immutable.
 */
public final class Wording {
  private static final Pattern PLACEHOLDER = Pattern.compile("\\{([a-z]+)}");
  private static final String ENGLISH = "en";

  private final Locale locale;
  private final Properties words;

  private Wording(Locale locale, Properties words) {
    this.locale = locale;
    this.words = words;
  }

  /**
   * The wording of a language; English where there is none.
   *
   * @param languageTag for instance {@code en} or {@code de-AT}
   */
  public static Wording of(String languageTag) {
    Locale locale = Locale.forLanguageTag(languageTag);
    Properties english = new Properties();
    load(ENGLISH, english);
    if (locale.getLanguage().equals(ENGLISH)) {
      return new Wording(locale, english);
    }
    Properties words = new Properties(english);
    boolean found = load(locale.getLanguage(), words);
    return new Wording(found ? locale : Locale.ENGLISH, words);
  }

  private static boolean load(String language, Properties into) {
    String name = language + ".properties";
    try (InputStream in = Wording.class.getResourceAsStream(name)) {
      if (in == null) {
        return false;
      }
      try (Reader reader = new InputStreamReader(in, StandardCharsets.UTF_8)) {
        into.load(reader);
      }
      return true;
    } catch (IOException e) {
      throw new UncheckedIOException("the sheet's wording " + name + " cannot be read", e);
    }
  }

  /** Whose decimal sign the sheet uses, and in whose language blocks are named. */
  public Locale locale() {
    return locale;
  }

  /** All keys. */
  public Set<String> keys() {
    return new TreeSet<>(words.stringPropertyNames());
  }

  /**
   * The words of a key, its placeholders filled.
   *
   * @param key of the wording
   * @param namesAndValues a placeholder's name, then what stands for it, and so on
   * @throws IllegalArgumentException when there is no such key, or its placeholders are others
   */
  public String text(String key, String... namesAndValues) {
    String pattern = words.getProperty(key);
    if (pattern == null) {
      throw new IllegalArgumentException("the sheet has no words for '" + key + "'");
    }
    StringBuilder filled = new StringBuilder();
    Matcher matcher = PLACEHOLDER.matcher(pattern);
    while (matcher.find()) {
      String value = valueOf(matcher.group(1), key, namesAndValues);
      matcher.appendReplacement(filled, Matcher.quoteReplacement(value));
    }
    matcher.appendTail(filled);
    return filled.toString();
  }

  private static String valueOf(String name, String key, String... namesAndValues) {
    for (int i = 0; i + 1 < namesAndValues.length; i += 2) {
      if (namesAndValues[i].equals(name)) {
        return namesAndValues[i + 1];
      }
    }
    throw new IllegalArgumentException("the words of '" + key + "' want {" + name + "}");
  }

  /** The names of the placeholders of a key. */
  public Set<String> placeholders(String key) {
    Set<String> names = new TreeSet<>();
    Matcher matcher = PLACEHOLDER.matcher(text(key, filler(key)));
    while (matcher.find()) {
      names.add(matcher.group(1));
    }
    return names;
  }

  private String[] filler(String key) {
    Matcher matcher = PLACEHOLDER.matcher(words.getProperty(key, ""));
    return matcher
        .results()
        .flatMap(found -> java.util.stream.Stream.of(found.group(1), found.group()))
        .toArray(String[]::new);
  }
}
