package earward.desktop.model;

import earward.block.Conditions;
import earward.block.quantity.Unit;
import java.util.List;

/** The numbers of the conditions, each with its unit, in the order in which they are asked. */
enum ConditionValue {
  CARRIER("carrier", Unit.HERTZ),
  TONE("tone", Unit.HERTZ),
  HIGHEST_TONE("highest-tone", Unit.HERTZ),
  LOWEST_TONE("lowest-tone", Unit.HERTZ),
  TEST_DEPTH("test-depth", Unit.FRACTION),
  DEEPEST_DEPTH("deepest-depth", Unit.FRACTION),
  WEAK_CARRIER("weak-carrier", Unit.VOLT),
  TEST_CARRIER("test-carrier", Unit.VOLT),
  STRONG_CARRIER("strong-carrier", Unit.VOLT),
  AMBIENT("ambient", Unit.CELSIUS),
  HIGHEST_AMBIENT("highest-ambient", Unit.CELSIUS),
  WANTED_WATTS("wanted-watts", Unit.WATT);

  private final String key;
  private final Unit unit;

  ConditionValue(String key, Unit unit) {
    this.key = key;
    this.unit = unit;
  }

  String key() {
    return key;
  }

  Unit unit() {
    return unit;
  }

  double of(Conditions core) {
    return all(core)[index()];
  }

  /** The conditions with this number changed. */
  Conditions in(Conditions core, double value) {
    double[] all = all(core);
    all[index()] = value;
    return new Conditions(
        all[0], all[1], all[2], all[3], all[4], all[5], all[6], all[7], all[8], all[9], all[10],
        all[11]);
  }

  /** The place in the conditions, which are asked in their own order. */
  private int index() {
    return List.of(values()).indexOf(this);
  }

  private static double[] all(Conditions core) {
    return new double[] {
      core.carrierHertz(),
      core.toneHertz(),
      core.highestToneHertz(),
      core.lowestToneHertz(),
      core.testDepth(),
      core.deepestDepth(),
      core.weakPeakVolts(),
      core.testPeakVolts(),
      core.strongPeakVolts(),
      core.ambientCelsius(),
      core.highestAmbientCelsius(),
      core.wantedWatts()
    };
  }
}
