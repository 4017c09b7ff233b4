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
 * The words of a block type: {@code texts.properties} (English) and {@code
 * texts_LANGUAGE.properties} in UTF-8 beside its class. Keys are {@code BLOCK-TYPE-ID.KEY} where
 * KEY is {@code name}, {@code help}, {@code setting.ID}, {@code setting.ID.help}, {@code
 * setting.ID.OPTION}, {@code part.ID}, {@code test-point.ID}, {@code check.CODE} or {@code
 * curve.ID}.
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
