package earward.sheet.wording;

import java.io.IOException;
import java.io.InputStream;
import java.io.InputStreamReader;
import java.io.Reader;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.DirectoryIteratorException;
import java.nio.file.DirectoryStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Locale;
import java.util.Properties;
import java.util.Set;
import java.util.TreeSet;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.Stream;

/**
 * The words of the sheet in one language, from {@code templates/sheets/LANGUAGE.properties}; what a
 * language lacks is taken from English. Immutable.
 */
public final class Wording {
  private static final Pattern PLACEHOLDER = Pattern.compile("\\{([a-z]+)}");
  private static final String ENGLISH = "en";
  private static final String ENDING = ".properties";

  private final Locale locale;
  private final Properties words;

  private Wording(Locale locale, Properties words) {
    this.locale = locale;
    this.words = words;
  }

  /**
   * The wording that the program holds; English where it does not hold the language.
   *
   * @param languageTag for instance {@code en} or {@code de-AT}
   */
  public static Wording of(String languageTag) {
    Locale locale = Locale.forLanguageTag(languageTag);
    Properties english = new Properties();
    load(ENGLISH, english);
    Properties words = new Properties(english);
    boolean found = load(locale.getLanguage(), words);
    return new Wording(found ? locale : Locale.ENGLISH, words);
  }

  /**
   * The languages that a sheet can be printed in: those that the program holds, and those of the
   * files in a folder.
   *
   * @param folder where {@code LANGUAGE.properties} may be; it need not exist
   */
  public static Set<String> languages(Path folder) {
    Set<String> languages = new TreeSet<>();
    for (String language : Locale.getISOLanguages()) {
      if (Wording.class.getResource(language + ENDING) != null) {
        languages.add(language);
      }
    }
    try (DirectoryStream<Path> files = Files.newDirectoryStream(folder, "*" + ENDING)) {
      for (Path file : files) {
        String name = String.valueOf(file.getFileName());
        languages.add(name.substring(0, name.length() - ENDING.length()));
      }
    } catch (IOException | DirectoryIteratorException e) {
      return languages; // no folder of a club's own: the program's own languages remain
    }
    return languages;
  }

  /**
   * The wording of a file in a folder, over the one that the program holds.
   *
   * @param folder where {@code LANGUAGE.properties} may be; where it is not, the program's own
   *     wording holds
   * @param languageTag for instance {@code en} or {@code de-AT}
   * @throws WordingException when the file cannot be read, or its words want other placeholders
   */
  public static Wording of(Path folder, String languageTag) throws WordingException {
    Locale locale = Locale.forLanguageTag(languageTag);
    Path file = folder.resolve(locale.getLanguage() + ENDING);
    Wording own = of(languageTag);
    if (!Files.isRegularFile(file)) {
      return own;
    }
    Properties words = new Properties(own.words);
    try (Reader reader = Files.newBufferedReader(file)) {
      words.load(reader);
    } catch (IOException e) {
      throw new WordingException("The sheet's wording " + file + " cannot be read as UTF-8.");
    } catch (IllegalArgumentException e) {
      throw new WordingException(
          "The sheet's wording " + file + " has a backslash that begins no letter: \\uXXXX.");
    }
    Wording read = new Wording(locale, words);
    requireSamePlaceholders(read, file);
    return read;
  }

  private static void requireSamePlaceholders(Wording read, Path file) throws WordingException {
    Wording english = of(ENGLISH);
    for (String key : english.keys()) {
      Set<String> wanted = english.placeholders(key);
      Set<String> found = read.placeholders(key);
      if (!wanted.containsAll(found)) {
        found.removeAll(wanted);
        throw new WordingException(
            "In the sheet's wording "
                + file
                + ", '"
                + key
                + "' wants {"
                + String.join("}, {", found)
                + "}, which the program does not give; it gives "
                + (wanted.isEmpty() ? "nothing" : "{" + String.join("}, {", wanted) + "}")
                + ".");
      }
    }
  }

  private static boolean load(String language, Properties into) {
    String name = language + ENDING;
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
    Stream<String> found =
        PLACEHOLDER.matcher(words.getProperty(key, "")).results().map(match -> match.group(1));
    found.forEach(names::add);
    return names;
  }
}
