package earward.kit.file;

import earward.block.check.Finding;
import earward.block.check.Severity;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;

/** The file that is being read, and what was noted in it on the way. For one reading. */
final class FileSource {
  private final String fileName;
  private final List<Finding> notes = new ArrayList<>();
  private final Map<String, FilePlace> places = new HashMap<>();

  FileSource(String fileName) {
    this.fileName = fileName;
  }

  String fileName() {
    return fileName;
  }

  List<Finding> notes() {
    return List.copyOf(notes);
  }

  /** Where each thing that findings may be about stands. */
  Map<String, FilePlace> places() {
    return Map.copyOf(places);
  }

  /** Keeps where something stands. */
  void stands(String subject, Json.Place at) {
    if (at.line() > 0) {
      places.put(subject, new FilePlace(at.line(), at.column()));
    }
  }

  void noteUnknown(Json.Member member, String owner) {
    Json.Place at = member.value().at();
    String place = fileName + ", line " + at.line() + ", column " + at.column();
    notes.add(
        Finding.of(
            Severity.NOTE,
            "unknown-member",
            place,
            place
                + ": '"
                + member.name()
                + "' of "
                + owner
                + " is not known to this program; it is kept and has no effect: check its"
                + " spelling"));
  }
}
