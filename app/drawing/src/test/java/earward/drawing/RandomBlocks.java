package earward.drawing;

import static earward.block.device.Terminal.BASE;
import static earward.block.device.Terminal.BOTTOM;
import static earward.block.device.Terminal.COLLECTOR;
import static earward.block.device.Terminal.EMITTER;
import static earward.block.device.Terminal.INPUT;
import static earward.block.device.Terminal.INVERTING;
import static earward.block.device.Terminal.OUTPUT;
import static earward.block.device.Terminal.SUPPLY;
import static earward.block.device.Terminal.TOP;
import static earward.block.device.Terminal.WIPER;
import static earward.block.wiring.Nodes.GROUND;
import static earward.block.wiring.Nodes.MAIN_RAIL;

import earward.block.device.Device;
import earward.block.device.Potentiometer;
import earward.block.device.Taper;
import earward.block.device.Terminal;
import earward.block.wiring.Port.Single;
import earward.block.wiring.Wiring;
import earward.block.wiring.WiringPlan;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Random;

/** Blocks that nobody would build, of every placement word, from a seed. */
final class RandomBlocks {
  private final Random random;
  private final List<String> nodes = new ArrayList<>(List.of("in"));
  private final WiringPlan plan = Wiring.from(new Single("in"));
  private int count;

  private RandomBlocks(long seed) {
    random = new Random(seed);
  }

  static SheetBlock of(long seed) {
    return new RandomBlocks(seed).block();
  }

  private SheetBlock block() {
    int parts = 3 + random.nextInt(9);
    while (count < parts) {
      add("p" + ++count);
    }
    plan.testPoint("t1", any()).testPoint("t2", any());
    return SheetBlock.plain("random", plan.to(new Single(nodes.get(nodes.size() - 1))));
  }

  private String any() {
    return nodes.get(random.nextInt(nodes.size()));
  }

  private String fresh() {
    nodes.add("n" + count);
    return "n" + count;
  }

  private Device device() {
    return switch (random.nextInt(5)) {
      case 0 -> Examples.farads(1e-9);
      case 1 -> Examples.farads(10e-6);
      case 2 -> Examples.diode();
      case 3 -> Examples.loudspeaker();
      default -> Examples.ohms(1e3);
    };
  }

  private void add(String id) {
    String at = any();
    switch (random.nextInt(9)) {
      case 0, 1 -> plan.at(at).run(id, device(), random.nextInt(6) == 0 ? other(at) : fresh());
      case 2, 3 -> plan.at(at).down(id, device(), random.nextInt(3) == 0 ? fresh() : GROUND);
      case 4 -> plan.at(at).up(id, device(), random.nextInt(3) == 0 ? fresh() : MAIN_RAIL);
      case 5 -> bridge(id, at);
      case 6 -> body(id, at);
      case 7 -> transistor(id, at);
      default -> column(id, at);
    }
  }

  private String other(String node) {
    String found = any();
    return found.equals(node) ? GROUND : found;
  }

  private void bridge(String id, String at) {
    plan.bridge(id, device(), at, other(at));
  }

  private void body(String id, String at) {
    if (random.nextBoolean()) {
      plan.at(at)
          .body(
              id,
              new Potentiometer(10e3, Taper.LINEAR, 0.5),
              Map.of(TOP, at, BOTTOM, GROUND, WIPER, fresh()));
    } else {
      String inverting = any();
      plan.at(at)
          .body(
              id,
              Examples.opAmp(),
              Map.of(
                  INPUT,
                  at,
                  INVERTING,
                  inverting,
                  OUTPUT,
                  fresh(),
                  SUPPLY,
                  MAIN_RAIL,
                  Terminal.GROUND,
                  GROUND));
    }
  }

  private void transistor(String id, String at) {
    plan.at(at)
        .body(
            id,
            Examples.transistor(random.nextBoolean()),
            Map.of(BASE, at, COLLECTOR, fresh(), EMITTER, random.nextBoolean() ? GROUND : any()));
  }

  private void column(String id, String at) {
    String middle = fresh();
    plan.column(
            id,
            Examples.transistor(false),
            COLLECTOR,
            Map.of(COLLECTOR, MAIN_RAIL, BASE, at, EMITTER, middle))
        .column(
            id + "-low",
            Examples.transistor(true),
            EMITTER,
            Map.of(EMITTER, middle, BASE, any(), COLLECTOR, GROUND));
  }
}
