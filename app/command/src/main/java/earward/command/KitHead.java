package earward.command;

import com.fasterxml.jackson.databind.node.ObjectNode;
import earward.kit.design.KitDesign;
import earward.kit.file.Designs;
import earward.kit.review.ReviewedKit;

/** Which kit it is: title, revision and digest. */
final class KitHead {
  private KitHead() {}

  static String line(ReviewedKit reviewed) {
    KitDesign design = design(reviewed);
    return design.title()
        + ", revision "
        + design.revision()
        + ", digest "
        + Designs.digest(design).shortForm();
  }

  static ObjectNode json(ReviewedKit reviewed) {
    KitDesign design = design(reviewed);
    return JsonOut.object()
        .put("title", design.title())
        .put("revision", design.revision())
        .put("digest", Designs.digest(design).hex());
  }

  private static KitDesign design(ReviewedKit reviewed) {
    return reviewed.solved().assembly().design();
  }
}
