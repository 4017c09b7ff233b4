package earward.block.testkit;

import earward.block.device.PartKind;
import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.Objects;
import java.util.regex.Pattern;

/** The names of the program's parts library as it was when the testkit was built. */
final class LibraryNames {
  private static final Pattern NAME = Pattern.compile("\"name\":\\s*\"([^\"]+)\"");

  private LibraryNames() {}

  /** All names of a kind, in the order of the library. */
  static List<String> of(PartKind kind) {
    String file = kind == PartKind.BATTERY ? "batteries" : kind.key() + "s";
    try (InputStream in =
        Objects.requireNonNull(
            LibraryNames.class.getResourceAsStream("parts/" + file + ".json"), file)) {
      String text = new String(in.readAllBytes(), StandardCharsets.UTF_8);
      return NAME.matcher(text).results().map(found -> found.group(1)).toList();
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }
}
