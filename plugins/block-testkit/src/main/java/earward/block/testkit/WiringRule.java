package earward.block.testkit;

import earward.block.BlockType;
import earward.block.Role;
import earward.block.wiring.Caution;
import earward.block.wiring.Nodes;
import earward.block.wiring.PartCaution;
import earward.block.wiring.TestPoint;
import earward.block.wiring.WiredPart;
import earward.block.wiring.Wiring;
import java.util.HashMap;
import java.util.HashSet;
import java.util.List;
import java.util.Map;

/**
 * Ports suit the role, no end hangs loose, every fitted part stands in the fitting order once, and
 * parts that can do harm carry their caution.
 */
public final class WiringRule implements BlockRule {
  @Override
  public List<String> faults(BlockType type, List<Variation> variations) {
    Faults faults = new Faults();
    for (Variation variation : variations) {
      variation.attempt(type).ifPresent(d -> of(type.role(), d.wiring(), faults));
      variation.attempt(type).ifPresent(d -> cautions(d.wiring(), variation, faults));
    }
    return faults.all();
  }

  private static void of(Role role, Wiring wiring, Faults faults) {
    ports(role, wiring, faults);
    looseEnds(wiring, faults);
    fittingOrder(wiring, faults);
    testPoints(wiring, faults);
  }

  private static void ports(Role role, Wiring wiring, Faults faults) {
    boolean entered = role != Role.FEED && role != Role.SUPPLY;
    boolean left = role.inPath() && role != Role.LOAD;
    String of = "a block of role " + role;
    faults.addIf(
        entered && wiring.entry().isEmpty(),
        of + " has an entry: begin with Wiring.from(new Single(\"in\"))");
    faults.addIf(
        !entered && wiring.entry().isPresent(), of + " has no entry: begin with Wiring.start()");
    faults.addIf(
        left && wiring.exit().isEmpty(), of + " has an exit: end with to(new Single(\"out\"))");
    faults.addIf(!left && wiring.exit().isPresent(), of + " has no exit: end with end()");
    faults.addIf(
        role == Role.TAKE_OFF && wiring.entry().filter(p -> p.nodes().size() > 1).isPresent(),
        of + " hangs on one node: begin with Wiring.from(new Single(\"in\"))");
    faults.addIf(
        role == Role.SUPPLY && wiring.offeredRails().isEmpty(),
        of + " offers at least one rail: call offerRail(\"main\", Nodes.MAIN_RAIL)");
    faults.addIf(
        role != Role.SUPPLY && !wiring.offeredRails().isEmpty(),
        of + " offers no rails; a supply does");
  }

  private static void looseEnds(Wiring wiring, Faults faults) {
    Map<String, Integer> ends = new HashMap<>();
    wiring.entry().ifPresent(port -> port.nodes().forEach(n -> ends.merge(n, 1, Integer::sum)));
    wiring.exit().ifPresent(port -> port.nodes().forEach(n -> ends.merge(n, 1, Integer::sum)));
    wiring
        .parts()
        .forEach(part -> part.nodes().values().forEach(n -> ends.merge(n, 1, Integer::sum)));
    ends.forEach(
        (node, count) ->
            faults.addIf(
                count < 2 && !Nodes.isShared(node),
                "node '"
                    + node
                    + "' has one end only; join a second part or a port to it, or correct a"
                    + " misspelt name"));
    for (WiredPart part : wiring.parts()) {
      faults.addIf(
          part.nodes().size() > 1 && new HashSet<>(part.nodes().values()).size() < 2,
          "all ends of part '" + part.id() + "' stand at one node, so it does nothing");
    }
  }

  private static void fittingOrder(Wiring wiring, Faults faults) {
    for (WiredPart part : wiring.parts()) {
      boolean named = wiring.fittingOrder().contains(part.id());
      faults.addIf(
          part.device().fitted() && !named,
          "part '" + part.id() + "' is not in the fitting order, though the builder fits it");
      faults.addIf(
          !part.device().fitted() && named,
          "part '" + part.id() + "' is in the fitting order, though it is not of the kit");
    }
  }

  private static void testPoints(Wiring wiring, Faults faults) {
    faults.addIf(
        wiring.testPoints().isEmpty(),
        "no test point: name a node where the builder can measure, with testPoint(id, node)");
    for (TestPoint point : wiring.testPoints()) {
      faults.addIf(
          point.node().equals(Nodes.GROUND), "test point '" + point.id() + "' stands at ground");
      boolean otherNode =
          !point.node().equals(point.id())
              && wiring.parts().stream().anyMatch(p -> p.nodes().containsValue(point.id()));
      faults.addIf(
          otherNode,
          "test point '"
              + point.id()
              + "' stands at node '"
              + point.node()
              + "', and another node has its name; rename one of them");
    }
  }

  private static void cautions(Wiring wiring, Variation variation, Faults faults) {
    for (WiredPart part : wiring.parts()) {
      for (Caution caution : Hazards.of(part.device())) {
        if (!wiring.cautions().contains(new PartCaution(part.id(), caution))) {
          faults.addIn(
              variation,
              "part '"
                  + part.id()
                  + ("' can do harm: call caution(\"" + part.id())
                  + ("\", Caution." + caution + ")")
                  + Hazards.onlyWhen(caution).map(when -> ", only when " + when).orElse(""));
        }
      }
    }
  }
}
