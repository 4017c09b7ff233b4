package earward.block;

import java.io.IOException;
import java.io.InputStream;
import java.io.InputStreamReader;
import java.io.Reader;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.Locale;
import java.util.Optional;
import java.util.Properties;

/**
 * The words of a block type: {@code texts.properties} (English) and, where there is one, {@code
 * texts_LANGUAGE.properties}, both in UTF-8 beside its class. A key is the block type's id, a point
 * and one of
 *
 * <ul>
 *   <li>{@code name}, {@code help}: of the block;
 *   <li>{@code setting.ID}, {@code setting.ID.help}: of each setting;
 *   <li>{@code setting.ID.OPTION}: of each option of a choice;
 *   <li>{@code part.ID}, {@code test-point.ID}, {@code curve.ID}: of each of these;
 *   <li>{@code check.CODE}: one sentence with {@code {figure}} and {@code {limit}}, into which the
 *       host puts the numbers with their units, then one that says what to do; where it helps, with
 *       {@code {place}}, the id that the block has in the design, for instance {@code volume};
 *   <li>{@code finding.CODE}: the sentence of a finding that its judgement gives by {@code
 *       Finding.inWords}, with {@code {place}} where that helps.
 * </ul>
 *
 * <p>Example: {@code volume.two-resistor-pad.check.coupling-edge = The bass ends at {figure}; the
 * band wanted goes down to {limit}. Take a larger capacitor.}
 *
 * <p>All blocks of a package share one file, told apart by the type id in front of each key.
 *
 * <p>Immutable.
 */
public final class BlockTexts {
  private final String typeId;
  private final Properties words;

  private BlockTexts(String typeId, Properties words) {
    this.typeId = typeId;
    this.words = words;
  }

  /**
   * Reads the words of a type; what the language lacks is taken from English.
   *
   * @throws UncheckedIOException when the jar cannot be read
   */
  public static BlockTexts of(BlockType type, Locale locale) {
    Properties english = read(type.besideTexts(), "texts.properties", new Properties());
    Properties words =
        read(type.besideTexts(), "texts_" + locale.getLanguage() + ".properties", english);
    return new BlockTexts(type.id(), words);
  }

  private static Properties read(Class<?> beside, String name, Properties fallback) {
    Properties words = new Properties(fallback);
    try (InputStream in = beside.getResourceAsStream(name)) {
      if (in != null) {
        try (Reader reader = new InputStreamReader(in, StandardCharsets.UTF_8)) {
          words.load(reader);
        }
      }
    } catch (IOException e) {
      throw new UncheckedIOException("cannot read " + name + " beside " + beside.getName(), e);
    }
    return words;
  }

  /** The words of a key, or empty where the type has none. */
  public Optional<String> find(String key) {
    return Optional.ofNullable(words.getProperty(typeId + "." + key));
  }

  /** The words of a key, or the key itself where the type has none. */
  public String get(String key) {
    return find(key).orElse(key);
  }
}
