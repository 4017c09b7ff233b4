package earward.kit.design;

import earward.block.device.Adaptor;
import earward.block.device.AudioAmplifier;
import earward.block.device.Battery;
import earward.block.device.BipolarTransistor;
import earward.block.device.Capacitor;
import earward.block.device.CarrierGenerator;
import earward.block.device.Device;
import earward.block.device.Diode;
import earward.block.device.FieldEffectTransistor;
import earward.block.device.Fuse;
import earward.block.device.Inductor;
import earward.block.device.Loudspeaker;
import earward.block.device.MeterMovement;
import earward.block.device.OperationalAmplifier;
import earward.block.device.Potentiometer;
import earward.block.device.Regulator;
import earward.block.device.Resistor;
import earward.block.device.Switch;
import earward.block.device.Transformer;
import earward.block.device.TunedFeed;
import java.util.Map;

/** The letters of reference designators: R7, C3, IC1 (common practice of kit makers). */
public final class ReferenceLetters {
  private static final Map<Class<? extends Device>, String> LETTERS =
      Map.ofEntries(
          Map.entry(Resistor.class, "R"),
          Map.entry(Capacitor.class, "C"),
          Map.entry(Inductor.class, "L"),
          Map.entry(Diode.class, "D"),
          Map.entry(Potentiometer.class, "RV"),
          Map.entry(CarrierGenerator.class, "G"),
          Map.entry(TunedFeed.class, "T"),
          Map.entry(Transformer.class, "T"),
          Map.entry(BipolarTransistor.class, "TR"),
          Map.entry(FieldEffectTransistor.class, "TR"),
          Map.entry(OperationalAmplifier.class, "IC"),
          Map.entry(AudioAmplifier.class, "IC"),
          Map.entry(Regulator.class, "IC"),
          Map.entry(Loudspeaker.class, "LS"),
          Map.entry(MeterMovement.class, "M"),
          Map.entry(Battery.class, "BT"),
          Map.entry(Adaptor.class, "PS"),
          Map.entry(Switch.class, "S"),
          Map.entry(Fuse.class, "F"));

  /** The letters of a test point. */
  public static final String TEST_POINT = "TP";

  private ReferenceLetters() {}

  /** The letters of a device kind. */
  public static String of(Device device) {
    String letters = LETTERS.get(device.getClass());
    if (letters == null) {
      throw new IllegalStateException("no letters for " + device.getClass().getSimpleName());
    }
    return letters;
  }
}
