package earward.block.testkit;

import earward.block.BlockType;
import java.util.List;

/** Settings that do not go together are refused, with one sentence that a designer can act on. */
final class RefusalRule implements BlockRule {
  @Override
  public List<String> faults(BlockType type, List<Variation> variations) {
    Faults faults = new Faults();
    for (Variation variation : variations) {
      try {
        variation.describe(type);
        faults.addIn(
            variation,
            "it takes settings of which its contract says that they do not go together; throw"
                + " IllegalArgumentException from describe, or correct goTogether");
      } catch (IllegalArgumentException e) {
        if (e.getMessage() == null || e.getMessage().isBlank()) {
          faults.addIn(
              variation, "it refuses settings without a word; give the exception a sentence");
        }
      } catch (RuntimeException e) {
        faults.addIn(
            variation,
            "it refuses settings with "
                + Shown.thrown(type, e)
                + "; throw IllegalArgumentException");
      }
    }
    return faults.all();
  }
}
