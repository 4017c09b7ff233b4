package earward.desktop.model;

import java.io.IOException;
import java.io.Reader;
import java.io.StringWriter;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Properties;

/**
 * What the user prefers, kept in one small file; a file that cannot be read or written is as if it
 * were not there. Lives on the event thread.
 */
public final class Preferences {
  private static final int MOST_RECENT = 8;
  private static final String RECENT = "recent.";

  private final Path file;
  private final Properties all = new Properties();

  /** How the window looks. */
  public enum Theme {
    SYSTEM,
    LIGHT,
    DARK
  }

  private Preferences(Path file) {
    this.file = file;
  }

  /** The preferences that a folder keeps. */
  public static Preferences in(Path folder) {
    Preferences preferences = new Preferences(folder.resolve("preferences.properties"));
    try (Reader reader = Files.newBufferedReader(preferences.file, StandardCharsets.UTF_8)) {
      preferences.all.load(reader);
    } catch (IOException | IllegalArgumentException e) {
      preferences.all.clear(); // the first start, or a broken file: the usual holds
    }
    return preferences;
  }

  /** The user's own folder for what the program keeps. */
  public static Path folder() {
    String named = System.getProperty("earward.user", "");
    if (!named.isBlank()) {
      return Path.of(named);
    }
    String home = System.getProperty("user.home", ".");
    String os = System.getProperty("os.name", "").toLowerCase(Locale.ROOT);
    if (os.contains("win")) {
      String data = System.getenv("APPDATA");
      return data == null ? Path.of(home, "Earward") : Path.of(data, "Earward");
    }
    return os.contains("mac")
        ? Path.of(home, "Library", "Application Support", "Earward")
        : Path.of(home, ".config", "earward");
  }

  /** How the window looks. */
  public Theme theme() {
    try {
      return Theme.valueOf(all.getProperty("theme", Theme.SYSTEM.name()));
    } catch (IllegalArgumentException e) {
      return Theme.SYSTEM;
    }
  }

  /** Takes another look. */
  public void theme(Theme changed) {
    set("theme", changed.name());
  }

  /** Size of all text, in percent of the usual. */
  public int textPercent() {
    try {
      return Math.max(80, Math.min(200, Integer.parseInt(all.getProperty("text", "100"))));
    } catch (NumberFormatException e) {
      return 100;
    }
  }

  /** Takes another size of text. */
  public void textPercent(int percent) {
    set("text", String.valueOf(percent));
  }

  /** Whether the comma is the decimal sign; the system's own unless chosen. */
  public boolean decimalComma() {
    String usual =
        String.valueOf(
            java.text.DecimalFormatSymbols.getInstance(Locale.getDefault(Locale.Category.FORMAT))
                    .getDecimalSeparator()
                == ',');
    return Boolean.parseBoolean(all.getProperty("decimal-comma", usual));
  }

  /** Takes the comma for the decimal sign, or the point. */
  public void decimalComma(boolean comma) {
    set("decimal-comma", String.valueOf(comma));
  }

  /** The designs last opened, the latest first; those that are gone are left out. */
  public List<Path> recent() {
    List<Path> recent = new ArrayList<>();
    for (int i = 0; i < MOST_RECENT; i++) {
      String path = all.getProperty(RECENT + i, "");
      if (!path.isBlank() && Files.isRegularFile(Path.of(path))) {
        recent.add(Path.of(path));
      }
    }
    return recent;
  }

  /** Remembers that a design was opened or saved. */
  public void opened(Path design) {
    List<Path> recent = new ArrayList<>(recent());
    Path absolute = design.toAbsolutePath().normalize();
    recent.remove(absolute);
    recent.add(0, absolute);
    for (int i = 0; i < MOST_RECENT; i++) {
      if (i < recent.size()) {
        all.setProperty(RECENT + i, recent.get(i).toString());
      } else {
        all.remove(RECENT + i);
      }
    }
    store();
  }

  private void set(String key, String value) {
    all.setProperty(key, value);
    store();
  }

  /** First beside the file, then moved over it, so that no failure leaves half a file. */
  private void store() {
    try {
      Path folder = file.toAbsolutePath().getParent();
      if (folder != null) {
        Files.createDirectories(folder);
      }
      StringWriter text = new StringWriter();
      all.store(text, "Earward");
      Path beside = file.resolveSibling(file.getFileName() + ".part");
      Files.writeString(beside, text.toString(), StandardCharsets.UTF_8);
      Files.move(beside, file, StandardCopyOption.REPLACE_EXISTING);
    } catch (IOException e) {
      all.setProperty(
          "unkept", String.valueOf(e.getMessage())); // they hold until the window closes
    }
  }
}
