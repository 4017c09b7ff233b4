package earward.kit.file;

import earward.block.check.Finding;
import earward.kit.design.KitDesign;
import java.util.List;
import java.util.Map;
import java.util.Objects;
import java.util.Optional;

/**
 * A design as read from its file.
 *
 * @param design what the file says
 * @param findings what is worth knowing of the file: members that the program does not know
 * @param places where each block and each setting stands, by {@code volume} and {@code volume.knob}
 */
public record DesignReading(
    KitDesign design, List<Finding> findings, Map<String, FilePlace> places) {
  public DesignReading {
    Objects.requireNonNull(design);
    findings = List.copyOf(findings);
    places = Map.copyOf(places);
  }

  /** Where the subject of a finding stands: the setting itself, or else its block. */
  public Optional<FilePlace> placeOf(String subject) {
    FilePlace own = places.get(subject);
    int point = subject.indexOf('.');
    return own != null || point < 0
        ? Optional.ofNullable(own)
        : Optional.ofNullable(places.get(subject.substring(0, point)));
  }
}
