package earward.filters;

import earward.block.BlockDescription;
import earward.block.BlockType;
import earward.block.Conditions;
import earward.block.Proposer;
import earward.block.Role;
import earward.block.check.Check;
import earward.block.check.RemedyHint;
import earward.block.check.Severity;
import earward.block.figure.CaseName;
import earward.block.figure.FigureName;
import earward.block.figure.Quantity;
import earward.block.law.RcEdge;
import earward.block.quantity.Series;
import earward.block.quantity.Unit;
import earward.block.setting.Setting;
import earward.block.setting.SettingValue;
import earward.block.setting.Values;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/** One RC section that keeps the carrier out of the audio. */
public final class CarrierRc implements BlockType {
  private static final double LEAST_FARADS = 10e-12;
  private static final double MOST_FARADS = 470e-9;

  /** How far above the highest tone the proposed corner lies (common practice). */
  private static final double CORNER_ABOVE_TONE = 5;

  @Override
  public String id() {
    return "filter.carrier-rc";
  }

  @Override
  public Role role() {
    return Role.AUDIO_FILTER;
  }

  @Override
  public List<Setting> settings() {
    return List.of(
        new Setting.Value("r2", Unit.OHM, 2.2e3, 10, 1e6, Series.E12),
        new Setting.Value("c2", Unit.FARAD, 1e-9, LEAST_FARADS, MOST_FARADS, Series.E12));
  }

  @Override
  public BlockDescription describe(Values values, Conditions conditions) {
    return BlockDescription.of(
        RcSection.of(values.amount("r2"), values.amount("c2")),
        Check.atLeast(
            "treble-edge",
            Severity.NOTE,
            new FigureName("out", Quantity.HIGH_EDGE_HERTZ, CaseName.TEST),
            conditions.highestToneHertz(),
            "the kit design's own audio band",
            RemedyHint.lower("c2"),
            RemedyHint.lower("r2")));
  }

  /** C2 for a corner of five times the highest tone, with the source's resistance in line. */
  @Override
  public Optional<Proposer> proposer() {
    return Optional.of(
        asked -> {
          double ohms = asked.values().amount("r2") + asked.sourceOhms();
          double corner = CORNER_ABOVE_TONE * asked.conditions().highestToneHertz();
          double farads = Series.E12.nearest(RcEdge.farads(ohms, corner));
          double within = Math.min(MOST_FARADS, Math.max(LEAST_FARADS, farads));
          return Map.of("c2", new SettingValue.Amount(within));
        });
  }
}
