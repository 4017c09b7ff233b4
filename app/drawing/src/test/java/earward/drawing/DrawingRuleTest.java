package earward.drawing;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import earward.drawing.internal.element.Dot;
import earward.drawing.internal.element.Element;
import earward.drawing.internal.element.Mark;
import earward.drawing.internal.element.Wire;
import java.util.ArrayList;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/** Drawings of whole paths and of every placement word keep the rule. */
class DrawingRuleTest {
  private static final LayoutOptions USUAL = LayoutOptions.usual(Examples.font());

  /** A path by name. */
  record Case(String name, List<SheetBlock> path, List<SheetBlock> beside) {
    @Override
    public String toString() {
      return name;
    }
  }

  static Stream<Case> cases() {
    return Examples.cases().stream();
  }

  @ParameterizedTest
  @MethodSource("cases")
  void theDrawingReadBackIsTheDescribedCircuitAndNothingOverlaps(Case drawn) {
    assertEquals(List.of(), DrawingRule.broken(drawn.path(), drawn.beside(), USUAL));
  }

  @ParameterizedTest
  @MethodSource("cases")
  void theDrawingKeepsTheWidthOfThePage(Case drawn) {
    Schematic schematic = Schematics.lay(drawn.path(), drawn.beside(), USUAL);
    assertTrue(schematic.width() <= 510, "width " + schematic.width());
  }

  /** Were the reader blind, each of these would pass: one wire or dot less is another circuit. */
  @Test
  void everyWireAndDotMattersToTheNetlist() {
    List<SheetBlock> path = Examples.lantern();
    Netlist described = Netlist.described(path, List.of());
    Schematic drawn = Schematics.lay(path, List.of(), USUAL);
    int tried = 0;
    for (Element element : drawn.elements()) {
      if (element instanceof Wire || element instanceof Dot) {
        List<Element> less = new ArrayList<>(drawn.elements());
        less.remove(element);
        Schematic damaged = drawn.withElements(less);
        boolean seen =
            !described.differences(damaged.readBack()).isEmpty() || !damaged.overlaps().isEmpty();
        assertTrue(seen || hangsLoose(element, drawn), "not missed: " + element);
        tried++;
      }
    }
    assertTrue(tried > 40, "only " + tried);
  }

  /** A wire to a port that nothing follows joins no two ends, with a corner in it or without. */
  private static boolean hangsLoose(Element element, Schematic drawn) {
    return element instanceof Wire wire && leadsToPort(wire.x2(), wire.y2(), drawn, 2);
  }

  private static boolean leadsToPort(double x, double y, Schematic drawn, int corners) {
    for (Element other : drawn.elements()) {
      if (other instanceof Mark mark
          && mark.kind() == Mark.Kind.PORT
          && Math.hypot(mark.x() - x, mark.y() - y) < 0.001) {
        return true;
      }
      if (corners > 0
          && other instanceof Wire next
          && Math.hypot(next.x1() - x, next.y1() - y) < 0.001
          && leadsToPort(next.x2(), next.y2(), drawn, corners - 1)) {
        return true;
      }
    }
    return false;
  }

  @Test
  void aWireThroughASymbolIsFound() {
    Schematic drawn = Schematics.single(Examples.filter(), USUAL);
    var bounds = drawn.partBounds().get("filter.c2");
    List<Element> more = new ArrayList<>(drawn.elements());
    double y = bounds.getCenterY();
    more.add(new Wire(0, y, drawn.width(), y));
    assertFalse(drawn.withElements(more).overlaps().isEmpty());
  }

  @Test
  void largerTextGivesALargerDrawingOfTheSameCircuit() {
    LayoutOptions large = new LayoutOptions(510, 10, Examples.font(), LayoutWords.english());
    assertEquals(List.of(), DrawingRule.broken(Examples.lantern(), List.of(), large));
    double usual = Schematics.lay(Examples.lantern(), List.of(), USUAL).height();
    assertTrue(Schematics.lay(Examples.lantern(), List.of(), large).height() > usual);
  }
}
