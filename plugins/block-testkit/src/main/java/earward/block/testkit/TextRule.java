package earward.block.testkit;

import earward.block.BlockDescription;
import earward.block.BlockTexts;
import earward.block.BlockType;
import earward.block.check.Finding;
import earward.block.setting.Setting;
import java.io.IOException;
import java.io.InputStream;
import java.io.InputStreamReader;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.HashSet;
import java.util.List;
import java.util.Locale;
import java.util.Properties;
import java.util.Set;
import java.util.TreeSet;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/**
 * Every setting, option, part, test point, check and curve has its words in English, in every other
 * language that the block speaks too, and there are no words for what the block does not have.
 */
public final class TextRule implements BlockRule {
  private static final Pattern PLACEHOLDER = Pattern.compile("\\{([^}]*)}");
  private static final Set<String> KNOWN = Set.of("figure", "limit", "place");
  private static final String ENGLISH = "texts.properties";

  /** Of a judgement: which of them there are depends on the figures of a kit. */
  private static final String JUDGED = Finding.textKey("");

  private static final List<String> LANGUAGES = List.of("en", "de", "fr", "es", "nl", "it", "pl");

  @Override
  public List<String> faults(BlockType type, List<Variation> variations) {
    Faults faults = new Faults();
    Set<String> wanted = wanted(type, variations);
    BlockTexts english = BlockTexts.of(type, Locale.ROOT);
    for (String key : wanted) {
      String words = english.find(key).orElse("").strip();
      faults.addIf(
          words.isBlank(),
          "texts.properties beside the class lacks the line " + type.id() + "." + key + " = ...");
      if (key.startsWith("check.") && !words.isBlank()) {
        sentence(key, words, faults);
      }
      faults.addIf(
          key.startsWith(JUDGED) && !words.isBlank() && !words.endsWith("."),
          "text " + key + " is no sentence; end it with a full stop");
    }
    for (String language : LANGUAGES) {
      String file = language.equals("en") ? ENGLISH : "texts_" + language + ".properties";
      Set<String> found = keys(type, file);
      if (!found.isEmpty()) {
        compare(file, wanted, found, faults);
      }
    }
    return faults.all();
  }

  private static void sentence(String key, String words, Faults faults) {
    faults.addIf(!words.endsWith("."), "text " + key + " is no sentence; end it with a full stop");
    for (String placeholder : List.of("{figure}", "{limit}")) {
      faults.addIf(
          !words.contains(placeholder),
          "text " + key + " lacks " + placeholder + ", so it would not say the numbers");
    }
    Matcher matcher = PLACEHOLDER.matcher(words);
    while (matcher.find()) {
      faults.addIf(
          !KNOWN.contains(matcher.group(1)),
          "text "
              + key
              + " has the placeholder "
              + matcher.group()
              + ", which nobody fills in;"
              + " there are {figure}, {limit} and {place}");
    }
  }

  private static void compare(String file, Set<String> wanted, Set<String> found, Faults faults) {
    boolean english = file.equals(ENGLISH);
    wanted.stream()
        .filter(key -> !english && !found.contains(key))
        .forEach(key -> faults.add(file + " lacks " + key + ", so that would be shown in English"));
    found.stream()
        .filter(key -> !wanted.contains(key) && !key.startsWith(JUDGED))
        .forEach(
            key ->
                faults.add(file + " has " + key + ", for which the block has no use; remove it"));
  }

  private static Set<String> keys(BlockType type, String file) {
    Properties words = new Properties();
    try (InputStream in = type.besideTexts().getResourceAsStream(file)) {
      if (in != null) {
        words.load(new InputStreamReader(in, StandardCharsets.UTF_8));
      }
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
    String prefix = type.id() + ".";
    Set<String> keys = new HashSet<>();
    for (String key : words.stringPropertyNames()) {
      if (key.startsWith(prefix)) {
        keys.add(key.substring(prefix.length()));
      }
    }
    return keys;
  }

  private static Set<String> wanted(BlockType type, List<Variation> variations) {
    Set<String> keys = new TreeSet<>(Set.of("name", "help"));
    for (Setting setting : type.settings()) {
      keys.add("setting." + setting.id());
      keys.add("setting." + setting.id() + ".help");
      if (setting instanceof Setting.Choice choice) {
        choice.options().forEach(option -> keys.add("setting." + choice.id() + "." + option));
      }
    }
    for (Variation variation : variations) {
      variation.attempt(type).ifPresent(description -> ofDescription(description, keys));
      keys.addAll(JudgementRule.textKeys(type, variation));
    }
    return keys;
  }

  private static void ofDescription(BlockDescription description, Set<String> keys) {
    description.wiring().parts().forEach(part -> keys.add("part." + part.id()));
    description.wiring().testPoints().forEach(point -> keys.add("test-point." + point.id()));
    description.checks().forEach(check -> keys.add("check." + check.code()));
    description.curves().forEach(curve -> keys.add("curve." + curve.id()));
  }
}
