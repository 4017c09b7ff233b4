package earward.block.check;

import static earward.block.Refused.refused;
import static org.assertj.core.api.Assertions.assertThat;

import earward.block.Conditions;
import earward.block.Curve;
import earward.block.figure.CaseName;
import earward.block.figure.FigureName;
import earward.block.figure.Quantity;
import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.DynamicTest;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.TestFactory;

class ChecksRefuseTest {
  private static final FigureName FIGURE =
      new FigureName("out", Quantity.DC_VOLTS, CaseName.NO_SIGNAL);

  private static Check check(String code, double limit, String source) {
    return Check.atMost(code, Severity.STOP, FIGURE, limit, source);
  }

  private static Curve curve(String id, double from, double to, int points) {
    return new Curve(id, "r1", from, to, points, List.of(FIGURE));
  }

  private static Conditions conditions(
      double carrier, double tone, double depth, double strong, double hottest) {
    return new Conditions(
        carrier, tone, 4.5e3, 150, 0.3, depth, 0.15, 1.2, strong, 25, hottest, 0.1);
  }

  @TestFactory
  Stream<DynamicTest> checksAndFindings() {
    return Stream.of(
        refused("a code in capitals", () -> check("Hot", 1, "x"), "'Hot'", "lower case"),
        refused("a limit that is none", () -> check("hot", Double.NaN, "x"), "limit", "hot"),
        refused("no source", () -> check("hot", 1, " "), "hot", "source"),
        refused("a remedy for nothing", () -> RemedyHint.raise(""), "remedy"),
        refused("no sentence", () -> Finding.of(Severity.NOTE, "c", "s", ""), "sentence"),
        refused("no code", () -> Finding.of(Severity.NOTE, "", "s", "x"), "code"));
  }

  @TestFactory
  Stream<DynamicTest> curvesAndFigureNames() {
    return Stream.of(
        refused("a curve in capitals", () -> curve("Level", 0, 1, 2), "'Level'"),
        refused("a curve that falls", () -> curve("level", 1, 0, 2), "'level'", "1.0 to 0.0"),
        refused("a curve of one point", () -> curve("level", 0, 1, 1), "'level'", "two points"),
        refused(
            "a curve of nothing", () -> new Curve("level", "r1", 0, 1, 2, List.of()), "a figure"),
        refused("no case", () -> FigureName.parse("out:dc-volts"), "place:quantity@case"),
        refused("no quantity", () -> FigureName.parse("out:volts@test"), "'volts'", "no quantity"),
        refused("a place with a blank", () -> FigureName.parse("o t:dc-volts@test"), "'o t'"),
        refused("a case in capitals", () -> new CaseName("Test"), "'Test'", "case name"));
  }

  @TestFactory
  Stream<DynamicTest> conditions() {
    return Stream.of(
        refused("a carrier in the audio", () -> conditions(4e3, 400, 0.8, 3, 40), "carrier (Hz)"),
        refused("no tone", () -> conditions(455e3, 0, 0.8, 3, 40), "test tone (Hz)"),
        refused("overmodulated", () -> conditions(455e3, 400, 1.1, 3, 40), "deepest depth is 1.1"),
        refused("no strong station", () -> conditions(455e3, 400, 0.8, 0, 40), "strong carrier"),
        refused("a hottest day that is cool", () -> conditions(455e3, 400, 0.8, 3, 20), "ambient"));
  }

  @Test
  void aFigureThatIsNoNumberHoldsNoRelation() {
    assertThat(Relation.AT_MOST.holds(Double.NaN, 1)).isFalse();
    assertThat(Relation.AT_LEAST.holds(Double.NaN, 1)).isFalse();
    assertThat(Relation.AT_MOST.holds(1, 1)).isTrue();
    assertThat(Relation.AT_LEAST.holds(1, 1)).isTrue();
  }

  @Test
  void aFigureNameReadsBackAsItIsWritten() {
    for (Quantity quantity : Quantity.values()) {
      for (CaseName caseName : CaseName.ALL) {
        FigureName name = new FigureName("wiper", quantity, caseName);
        assertThat(FigureName.parse(name.toString())).isEqualTo(name);
      }
    }
    assertThat(FIGURE.within("volume").toString()).isEqualTo("volume.out:dc-volts@no-signal");
  }
}
