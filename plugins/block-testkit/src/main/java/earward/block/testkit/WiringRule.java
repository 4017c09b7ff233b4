package earward.block.testkit;

import earward.block.BlockType;
import earward.block.Role;
import earward.block.device.AudioAmplifier;
import earward.block.device.Battery;
import earward.block.device.Capacitor;
import earward.block.device.Device;
import earward.block.wiring.Caution;
import earward.block.wiring.Nodes;
import earward.block.wiring.PartCaution;
import earward.block.wiring.WiredPart;
import earward.block.wiring.Wiring;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/**
 * Ports suit the role, no end hangs loose, every fitted part stands in the fitting order once, and
 * parts that can do harm carry their caution.
 */
public final class WiringRule implements BlockRule {
  @Override
  public List<String> faults(BlockType type, List<Variation> variations) {
    Faults faults = new Faults();
    for (Variation variation : variations) {
      Wiring wiring = variation.describe(type).wiring();
      ports(type.role(), wiring, faults);
      looseEnds(wiring, faults);
      fittingOrder(wiring, faults);
      testPoints(wiring, faults);
      cautions(wiring, faults);
    }
    return faults.all();
  }

  private static void ports(Role role, Wiring wiring, Faults faults) {
    boolean entered = role != Role.FEED && role != Role.SUPPLY;
    boolean left = role.inPath() && role != Role.LOAD;
    faults.addIf(
        wiring.entry().isPresent() != entered,
        "a block of role " + role + (entered ? " has an entry" : " has no entry"));
    faults.addIf(left && wiring.exit().isEmpty(), "a block of role " + role + " has an exit");
    faults.addIf(
        (role == Role.SUPPLY) == wiring.offeredRails().isEmpty(),
        "a supply, and only a supply, offers rails");
    wiring
        .offeredRails()
        .forEach(
            (name, node) ->
                faults.addIf(
                    wiring.parts().stream().noneMatch(p -> p.nodes().containsValue(node)),
                    "rail " + name + " is offered at '" + node + "', which no part touches"));
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
                "node '" + node + "' has one end only: nothing is connected to it"));
    for (WiredPart part : wiring.parts()) {
      faults.addIf(
          part.nodes().size() > 1 && new HashSet<>(part.nodes().values()).size() < 2,
          "all ends of part '" + part.id() + "' stand at one node");
    }
  }

  private static void fittingOrder(Wiring wiring, Faults faults) {
    List<String> order = new ArrayList<>(wiring.fittingOrder());
    for (WiredPart part : wiring.parts()) {
      boolean named = order.remove(part.id());
      faults.addIf(
          part.device().fitted() != named,
          part.device().fitted()
              ? "part '" + part.id() + "' is fitted but not in the fitting order"
              : "part '" + part.id() + "' is not fitted but in the fitting order");
    }
    order.forEach(id -> faults.add("part '" + id + "' is in the fitting order twice"));
  }

  private static void testPoints(Wiring wiring, Faults faults) {
    HashSet<String> ids = new HashSet<>();
    wiring
        .testPoints()
        .forEach(
            tp -> faults.addIf(!ids.add(tp.id()), "two test points are named '" + tp.id() + "'"));
  }

  private static void cautions(Wiring wiring, Faults faults) {
    for (WiredPart part : wiring.parts()) {
      needed(part.device())
          .filter(caution -> !wiring.cautions().contains(new PartCaution(part.id(), caution)))
          .ifPresent(
              caution -> faults.add("part '" + part.id() + "' lacks the caution " + caution));
    }
    for (PartCaution caution : wiring.cautions()) {
      faults.addIf(
          wiring.part(caution.partId()).isEmpty(),
          "a caution names '" + caution.partId() + "', no part of the block");
    }
  }

  private static Optional<Caution> needed(Device device) {
    if (device instanceof Capacitor capacitor && capacitor.dielectric().polarised()) {
      return Optional.of(Caution.POLARITY);
    } else if (device instanceof Battery) {
      return Optional.of(Caution.BATTERY_SHORT);
    } else if (device instanceof AudioAmplifier amplifier && amplifier.model().bridge()) {
      return Optional.of(Caution.BRIDGE_NEVER_TO_GROUND);
    }
    return Optional.empty();
  }
}
