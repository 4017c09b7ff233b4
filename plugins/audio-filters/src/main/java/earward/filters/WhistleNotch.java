package earward.filters;

import static earward.block.wiring.Nodes.GROUND;

import earward.block.BlockDescription;
import earward.block.BlockType;
import earward.block.Conditions;
import earward.block.Role;
import earward.block.check.Check;
import earward.block.check.Severity;
import earward.block.device.Resistor;
import earward.block.figure.CaseName;
import earward.block.figure.FigureName;
import earward.block.figure.Quantity;
import earward.block.law.TwinT;
import earward.block.quantity.Series;
import earward.block.quantity.Unit;
import earward.block.setting.Setting;
import earward.block.setting.Values;
import earward.block.wiring.Port.Single;
import earward.block.wiring.Wiring;
import earward.block.wiring.WiringPlan;
import java.util.ArrayList;
import java.util.List;

/**
 * A twin-T against the whistle between neighbouring channels, 9 or 10 kHz: plain, or narrowed by a
 * follower on whose output its foot stands. R/2 and 2C are two equal parts side by side, so that
 * four resistors and four capacitors of one lot make the notch.
 */
public final class WhistleNotch implements BlockType {
  private static final String PLAIN = "plain";

  /** The lower resistor of the divider that carries the foot, small against R/2. */
  private static final double FOOT_OHMS = 4.7e3;

  @Override
  public String id() {
    return "filter.whistle-notch";
  }

  @Override
  public Role role() {
    return Role.AUDIO_FILTER;
  }

  @Override
  public List<Setting> settings() {
    List<Setting> settings = new ArrayList<>();
    settings.add(new Setting.Choice("whistle", List.of("9-khz", "10-khz")));
    settings.add(new Setting.Choice("width", List.of("narrow", PLAIN)));
    settings.add(new Setting.Value("quality", Unit.NUMBER, 2, 0.5, 5, Series.ANY));
    settings.add(new Setting.Value("farads", Unit.FARAD, 470e-12, 100e-12, 4.7e-9, Series.E6));
    settings.addAll(Follower.settings());
    return settings;
  }

  static boolean goTogether(Values values) {
    return values.chosen("width", PLAIN) || Follower.goTogether(values);
  }

  @Override
  public BlockDescription describe(Values values, Conditions conditions) {
    WiringPlan plan = Wiring.from(new Single("in"));
    if (values.chosen("width", PLAIN)) {
      network(plan, values, "in", "out", GROUND);
      plan.testPoint("out", "out");
      return BlockDescription.of(plan.to(new Single("out")), trebleEdge(conditions));
    }
    double quality = values.amount("quality");
    double share = TwinT.share(quality);
    double upper = Series.E24.nearest(FOOT_OHMS * (1 - share) / share);
    Follower.enter(plan, values);
    network(plan, values, "hot", "plus", "foot");
    Follower.follow(plan, values);
    plan.at("drive")
        .down("r-share", new Resistor(upper), "foot")
        .at("foot")
        .down("r-foot", new Resistor(FOOT_OHMS), GROUND)
        .fit("r-share", "r-foot");
    Follower.leave(plan, values);
    return new BlockDescription(
        plan.to(new Single("out")),
        Follower.checks(values, conditions.highestToneHertz(), conditions.lowestToneHertz()),
        List.of());
  }

  private static void network(WiringPlan plan, Values values, String from, String to, String foot) {
    double farads = values.amount("farads");
    double hertz = values.chosen("whistle", "9-khz") ? 9e3 : 10e3;
    Resistor resistor = new Resistor(Series.E96.nearest(1 / (2 * Math.PI * hertz * farads)));
    plan.at(from)
        .run("r1", resistor, "middle")
        .down("c3", Film.of(farads), foot)
        .down("c4", Film.of(farads), foot)
        .run("r2", resistor, to)
        .at(from)
        .run("c1", Film.of(farads), "centre")
        .down("r3", resistor, foot)
        .down("r4", resistor, foot)
        .run("c2", Film.of(farads), to)
        .fit("r1", "r2", "r3", "r4", "c1", "c2", "c3", "c4");
  }

  private static Check trebleEdge(Conditions conditions) {
    return Check.atLeast(
        "treble-edge",
        Severity.NOTE,
        new FigureName("out", Quantity.HIGH_EDGE_HERTZ, CaseName.TEST),
        conditions.highestToneHertz(),
        "the kit design's own audio band");
  }
}
