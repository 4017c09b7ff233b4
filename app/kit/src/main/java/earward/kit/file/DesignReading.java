package earward.kit.file;

import earward.block.check.Finding;
import earward.kit.design.KitDesign;
import java.util.List;
import java.util.Objects;

/**
 * A design as read from its file.
 *
 * @param design what the file says
 * @param findings what is worth knowing of the file: members that the program does not know
 */
public record DesignReading(KitDesign design, List<Finding> findings) {
  public DesignReading {
    Objects.requireNonNull(design);
    findings = List.copyOf(findings);
  }
}
