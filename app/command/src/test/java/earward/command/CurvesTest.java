package earward.command;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import earward.block.figure.CaseName;
import earward.block.figure.Quantity;
import earward.engine.Response;
import earward.engine.SweptFigures;
import earward.kit.path.Assembly;
import earward.kit.path.Figures;
import earward.kit.path.KitCurves;
import earward.kit.path.KitSolver;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** The curves of the starter kits, and that they go through the figures. */
class CurvesTest {
  @ParameterizedTest
  @ValueSource(strings = {"lantern", "hayloft", "boathouse"})
  void curvesAreCompleteAndMeetTheFigures(String kit) {
    Assembly assembly = TestKits.assembled(TestKits.starter(kit));
    KitCurves curves = KitCurves.of(assembly).orElseThrow();
    Figures figures = KitSolver.solve(assembly).figures();
    assertThat(curves.response().points()).hasSize(200);
    assertThat(curves.depth().rows()).hasSize(12);
    assertThat(curves.level().rows()).hasSize(12);
    assertThat(curves.tone().rows()).hasSize(8);
    assertThat(curves.knobs()).isNotEmpty().allMatch(knob -> knob.rows().size() == 9);
    double most =
        curves.response().points().stream().mapToDouble(Response.Point::magnitude).max().orElse(0);
    double edge = figures.find("path", Quantity.HIGH_EDGE_HERTZ, CaseName.TEST).orElseThrow();
    // where the edge lies beyond the curve there is nothing to meet
    curves.response().points().stream()
        .filter(point -> point.hertz() >= edge)
        .findFirst()
        .ifPresent(
            near ->
                assertThat(20 * Math.log10(near.magnitude() / most)).isCloseTo(-3.01, within(0.4)));
    int distortion = column(curves.depth(), Quantity.DISTORTION);
    double least = curves.depth().rows().get(0).figures().get(distortion);
    double deepest = curves.depth().rows().get(11).figures().get(distortion);
    assertThat(deepest).isGreaterThan(least);
  }

  private static int column(SweptFigures swept, Quantity quantity) {
    for (int i = 0; i < swept.figures().size(); i++) {
      if (swept.figures().get(i).quantity() == quantity) {
        return i;
      }
    }
    throw new AssertionError("no column " + quantity);
  }
}
