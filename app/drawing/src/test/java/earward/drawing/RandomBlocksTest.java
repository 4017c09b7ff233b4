package earward.drawing;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;

/** Whatever is joined to whatever: the drawing says the same, and nothing overlaps. */
class RandomBlocksTest {
  private static final int BLOCKS = 150;

  @Test
  void anyBlockIsDrawnTruly() {
    LayoutOptions usual = LayoutOptions.usual(Examples.font());
    List<String> faults = new ArrayList<>();
    for (long seed = 0; seed < BLOCKS; seed++) {
      for (String fault : DrawingRule.broken(RandomBlocks.of(seed), usual)) {
        faults.add("seed " + seed + ": " + fault);
      }
    }
    assertEquals(List.of(), faults);
  }
}
