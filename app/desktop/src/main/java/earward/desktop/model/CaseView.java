package earward.desktop.model;

import earward.block.Conditions;
import earward.block.figure.CaseName;
import earward.block.setting.Setting;
import earward.kit.design.KitDesign;
import java.util.Objects;
import java.util.OptionalDouble;

/**
 * The case that live values are shown in: what the case bar says.
 *
 * @param signal what is received
 * @param knob where every volume control stands, from 0 to 1; empty: as the design has it
 * @param batteryLow whether batteries are at their end
 * @param asMeterReads whether the first instrument of the bench hangs on each test point
 */
public record CaseView(
    Signal signal, OptionalDouble knob, boolean batteryLow, boolean asMeterReads) {
  /** The test signal, knobs as set, fresh battery, true values. */
  public static final CaseView USUAL =
      new CaseView(Signal.TEST, OptionalDouble.empty(), false, false);

  /** What is received. */
  public enum Signal {
    NONE,
    WEAK,
    TEST,
    STRONG
  }

  public CaseView {
    Objects.requireNonNull(signal);
    Objects.requireNonNull(knob);
  }

  /** With another signal. */
  public CaseView with(Signal changed) {
    return new CaseView(changed, knob, batteryLow, asMeterReads);
  }

  /** With all knobs at a position. */
  public CaseView withKnob(OptionalDouble changed) {
    return new CaseView(signal, changed, batteryLow, asMeterReads);
  }

  /** With batteries new or at their end. */
  public CaseView withBatteryLow(boolean changed) {
    return new CaseView(signal, knob, changed, asMeterReads);
  }

  /** With true values or as the meter reads. */
  public CaseView withMeter(boolean changed) {
    return new CaseView(signal, knob, batteryLow, changed);
  }

  /** The case whose figures are read, of the design or of {@link #variant}. */
  public CaseName caseName() {
    return signal == Signal.NONE ? CaseName.NO_SIGNAL : CaseName.TEST;
  }

  /** Whether the figures of the design itself are those of this case. */
  public boolean ofTheDesign() {
    return (signal == Signal.TEST || signal == Signal.NONE)
        && knob.isEmpty()
        && !batteryLow
        && !asMeterReads;
  }

  /** The design as it is in this case: never shown or saved, only solved. */
  KitDesign variant(KitDesign design, Workshop workshop) {
    KitDesign changed = design;
    Conditions core = design.conditions().core();
    double peak =
        switch (signal) {
          case NONE, TEST -> core.testPeakVolts();
          case WEAK -> core.weakPeakVolts();
          case STRONG -> core.strongPeakVolts();
        };
    changed =
        changed.withConditions(
            changed.conditions().withCore(ConditionValue.TEST_CARRIER.in(core, peak)));
    if (knob.isPresent()) {
      String words = Math.round(knob.getAsDouble() * 100) + " %";
      for (var block : design.blocks()) {
        for (Setting setting : workshop.settings(block)) {
          if (setting instanceof Setting.Position) {
            changed = changed.withSetting(block.id(), setting.id(), words);
          }
        }
      }
    }
    return batteryLow ? Batteries.atTheirEnd(changed, workshop) : changed;
  }
}
