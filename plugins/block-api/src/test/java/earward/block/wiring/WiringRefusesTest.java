package earward.block.wiring;

import static earward.block.Refused.refused;
import static earward.block.device.Terminal.A;
import static earward.block.device.Terminal.ANODE;
import static earward.block.device.Terminal.B;
import static earward.block.device.Terminal.BOTTOM;
import static earward.block.device.Terminal.TOP;
import static earward.block.device.Terminal.WIPER;
import static earward.block.wiring.Nodes.GROUND;
import static org.assertj.core.api.Assertions.assertThat;

import earward.block.device.Potentiometer;
import earward.block.device.Resistor;
import earward.block.device.Taper;
import earward.block.wiring.Port.Pair;
import earward.block.wiring.Port.Single;
import earward.block.wiring.Port.TappedPair;
import java.util.Map;
import java.util.stream.Stream;
import org.junit.jupiter.api.DynamicTest;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.TestFactory;

class WiringRefusesTest {
  private static final Resistor R = new Resistor(1e3);

  private static WiringPlan plan() {
    return Wiring.from(new Single("in")).run("r1", R, "out");
  }

  @TestFactory
  Stream<DynamicTest> whatSpeaksOfThingsThatAreNotThere() {
    return Stream.of(
        refused("two parts of one name", () -> plan().run("r1", R, "b").end(), "two parts", "'r1'"),
        refused("an exit nowhere", () -> plan().to(new Single("far")), "the exit", "'far'", "out"),
        refused(
            "a test point nowhere",
            () -> plan().testPoint("tp", "far").end(),
            "test point 'tp'",
            "'far'"),
        refused(
            "two test points of one name",
            () -> plan().testPoint("tp", "in").testPoint("tp", "out").end(),
            "two test points are named 'tp'"),
        refused("a fitting order", () -> plan().fit("r2").end(), "fitting order", "'r2'", "[r1]"),
        refused(
            "a part fitted twice", () -> plan().fit("r1", "r1").end(), "fitting order", "twice"),
        refused(
            "a caution",
            () -> plan().caution("c1", Caution.POLARITY).end(),
            "caution POLARITY",
            "'c1'"),
        refused("a rail", () -> plan().offerRail("main", "far").end(), "rail 'main'", "'far'"));
  }

  @TestFactory
  Stream<DynamicTest> partsThatCannotStandSo() {
    Potentiometer track = new Potentiometer(1e3, Taper.LINEAR, 0.5);
    return Stream.of(
        refused(
            "no cursor", () -> Wiring.start().run("r1", R, "out"), "part 'r1'", "call at() first"),
        refused(
            "three ends along the signal",
            () -> plan().run("track", track, "wiper"),
            "part 'track'",
            "body or column"),
        refused(
            "a body on no node", () -> plan().body("track", track, Map.of()), "connected nowhere"),
        refused(
            "a terminal that it has not",
            () -> plan().body("r2", R, Map.of(A, "out", ANODE, "x")),
            "part 'r2' has no terminal ANODE"),
        refused(
            "entered where it is not connected",
            () -> plan().column("track", track, TOP, Map.of(WIPER, "out", BOTTOM, GROUND)),
            "entered at TOP",
            "not connected"),
        refused("a part name with a blank", () -> plan().run("r 2", R, "x"), "part", "'r 2'"),
        refused("a node name with a point", () -> plan().run("r2", R, "a.b"), "node", "'a.b'"),
        refused(
            "an end that is not connected",
            () ->
                plan()
                    .body("track", track, Map.of(TOP, "out", BOTTOM, GROUND))
                    .end()
                    .part("track")
                    .orElseThrow()
                    .node(WIPER),
            "part 'track'",
            "WIPER is not connected"));
  }

  @TestFactory
  Stream<DynamicTest> portsThatAreNone() {
    return Stream.of(
        refused("no name", () -> new Single(""), "node of a port", "''"),
        refused("one wire for two", () -> new Pair("a", "a"), "[a, a]", "a node of its own"),
        refused(
            "a tap at an end", () -> new TappedPair("a", "b", "b"), "[a, b, b]", "node of its own"),
        refused("a test point without name", () -> new TestPoint("", "out"), "test point"));
  }

  @Test
  void theCursorFollowsTheSignalOnly() {
    Wiring wiring =
        plan().down("r2", R, GROUND).up("r3", R, Nodes.MAIN_RAIL).run("r4", R, "end").end();

    assertThat(wiring.part("r2").orElseThrow().node(A)).isEqualTo("out");
    assertThat(wiring.part("r3").orElseThrow().node(A)).isEqualTo("out");
    assertThat(wiring.part("r4").orElseThrow().node(A)).isEqualTo("out");
    assertThat(wiring.part("r4").orElseThrow().node(B)).isEqualTo("end");
  }

  @Test
  void partsThatAreNotNamedAreFittedLast() {
    Wiring wiring = plan().run("r2", R, "a").run("r3", R, "b").fit("r3").end();

    assertThat(wiring.fittingOrder()).containsExactly("r3", "r1", "r2");
  }
}
