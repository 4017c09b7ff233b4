package earward.kit.file;

import earward.block.device.PartKind;
import earward.kit.parts.PartEntry;
import earward.kit.parts.PartsLibrary;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.stream.Stream;

/**
 * The parts library as a folder of JSON files, each with the parts of one kind: {@code {"schema":
 * 1, "kind": "diode", "parts": [...]}}.
 */
public final class PartsFiles {
  private static final String ENDING = ".json";

  private PartsFiles() {}

  /**
   * Reads every file of a folder that ends in {@code .json}, in the order of their names.
   *
   * @throws DesignFileException with one sentence that names the file, the entry and what is wrong
   *     with it
   */
  public static PartsLibrary read(Path folder) throws DesignFileException {
    List<PartEntry> entries = new ArrayList<>();
    Map<String, String> places = new HashMap<>();
    for (Path file : files(folder)) {
      Json tree = JsonReading.read(TextFiles.read(file), file.toString());
      MembersReader in =
          MembersReader.of(tree, new FileSource(file.toString()), "the parts library");
      PartKind kind = kind(in);
      for (Json item : in.items("parts")) {
        PartEntry entry = PartEntryForm.read(kind, item, in.source());
        String former = places.put(kind.key() + " " + entry.model().name(), place(file, item));
        if (former != null) {
          throw DesignFileException.of(
              "part-twice",
              file.toString(),
              item.at(),
              "the "
                  + kind.key()
                  + " '"
                  + entry.model().name()
                  + "' also stands in "
                  + former
                  + "; wanted once: rename one");
        }
        entries.add(entry);
      }
      PartEntryForm.requireAllKnown(in);
    }
    return new PartsLibrary(entries);
  }

  private static String place(Path file, Json item) {
    return file.getFileName() + ", line " + item.at().line();
  }

  private static PartKind kind(MembersReader in) throws DesignFileException {
    DesignForm.requireVersion(in);
    String key = in.requiredText("kind");
    return Arrays.stream(PartKind.values())
        .filter(kind -> kind.key().equals(key))
        .findFirst()
        .orElseThrow(
            () ->
                in.fault(
                    "unknown-choice",
                    in.object(),
                    "kind",
                    "is '"
                        + key
                        + "'; it can be "
                        + String.join(
                            ", ", Arrays.stream(PartKind.values()).map(PartKind::key).toList())));
  }

  private static List<Path> files(Path folder) throws DesignFileException {
    if (!Files.isDirectory(folder)) {
      throw TextFiles.fault(
          "missing-folder",
          folder,
          "there is no such folder; wanted the folder of the parts library");
    }
    List<Path> files;
    try (Stream<Path> all = Files.list(folder)) {
      files = all.filter(file -> file.toString().endsWith(ENDING)).sorted().toList();
    } catch (IOException e) {
      throw TextFiles.fault("unreadable", folder, "the folder cannot be read; check permissions");
    }
    if (files.isEmpty()) {
      throw TextFiles.fault(
          "empty-folder", folder, "the parts library has no files; wanted some ending in .json");
    }
    return files;
  }
}
