package earward.sheet.internal.gather;

import earward.block.device.Adaptor;
import earward.block.device.AudioAmplifier;
import earward.block.device.Battery;
import earward.block.device.BipolarTransistor;
import earward.block.device.Capacitor;
import earward.block.device.Device;
import earward.block.device.Dielectric;
import earward.block.device.Diode;
import earward.block.device.FieldEffectTransistor;
import earward.block.device.Inductor;
import earward.block.device.Loudspeaker;
import earward.block.device.MeterMovement;
import earward.block.device.OperationalAmplifier;
import earward.block.device.Potentiometer;
import earward.block.device.Regulator;
import earward.block.device.Resistor;
import earward.block.device.Switch;

/** What a part is to hands and to the shop: how high it stands, and how easily it is lost. */
final class Heights {
  private static final double SMALL_SPARES = 0.05;
  private static final double OTHER_SPARES = 0.02;

  private Heights() {}

  /** Usual height over the board, in millimetres (common practice); off the board it is last. */
  static double millimetres(Device device) {
    if (device instanceof Resistor || device instanceof Diode) {
      return 2.5;
    } else if (device instanceof AudioAmplifier || device instanceof OperationalAmplifier) {
      return 4;
    } else if (device instanceof Inductor) {
      return 5;
    } else if (device instanceof BipolarTransistor
        || device instanceof FieldEffectTransistor
        || device instanceof Regulator) {
      return 8;
    } else if (device instanceof Capacitor capacitor) {
      return capacitor.dielectric() == Dielectric.ELECTROLYTIC ? 12 : 7;
    } else if (device instanceof Potentiometer potentiometer) {
      return potentiometer.trimmer() ? 6 : 20;
    }
    return offBoard(device) ? 100 : 15;
  }

  /** Whether it is joined by wires rather than fitted on the board. */
  static boolean offBoard(Device device) {
    return device instanceof Loudspeaker
        || device instanceof Battery
        || device instanceof Adaptor
        || device instanceof Switch
        || device instanceof MeterMovement
        || (device instanceof Potentiometer potentiometer && !potentiometer.trimmer());
  }

  /** Share that is bought more of it (common practice). */
  static double spareShare(Device device) {
    boolean small =
        device instanceof Resistor || device instanceof Capacitor || device instanceof Diode;
    return small ? SMALL_SPARES : offBoard(device) ? 0 : OTHER_SPARES;
  }
}
