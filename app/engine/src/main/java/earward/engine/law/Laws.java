package earward.engine.law;

import earward.block.device.Adaptor;
import earward.block.device.AdaptorModel;
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
import java.util.List;

/** The one place where a device kind gets its law. */
public final class Laws {
  /** Where ripple rejection is given for a source that has none of its own: twice the mains. */
  private static final double HUM_HERTZ = 100;

  private Laws() {}

  /** What a law needs to know beside its seat. */
  public interface Surroundings {
    /** Place of the next diode among all diodes. */
    int nextDiode();

    /** Place of a part's first port among the carrier-driven ones, −1 for one not driven. */
    int driven(String part);

    /** Place of the next amplifier among all amplifiers. */
    int nextAmplifier();

    /** Capacitors that join an amplifier's COMPENSATION pin to its OUTPUT. */
    List<CapacitorLaw> compensation(String part);

    /** Capacitors that join an amplifier's BOOTSTRAP pin to its OUTPUT. */
    List<CapacitorLaw> bootstrap(String part);
  }

  /** How many branch unknowns a device brings. */
  public static int branches(Device device) {
    if (device instanceof TunedFeed) {
      return 2;
    }
    if (device instanceof Transformer) {
      return 4;
    }
    if (device instanceof AudioAmplifier amplifier) {
      return amplifier.model().bridge() ? 2 : 1;
    }
    return device instanceof Diode
            || device instanceof BipolarTransistor
            || device instanceof OperationalAmplifier
        ? 1
        : 0;
  }

  /** The law of a device in its seat. */
  public static Law of(Device device, Seat seat, Surroundings around) {
    if (device instanceof Resistor
        || device instanceof Switch
        || device instanceof Fuse
        || device instanceof MeterMovement) {
      return new ResistiveLaw(seat);
    } else if (device instanceof Capacitor capacitor) {
      return new CapacitorLaw(seat, capacitor.dielectric().polarised());
    } else if (device instanceof Inductor) {
      return new InductorLaw(seat);
    } else if (device instanceof Potentiometer potentiometer) {
      return new PotentiometerLaw(seat, potentiometer.tapped());
    } else if (device instanceof Loudspeaker loudspeaker) {
      return new LoudspeakerLaw(seat, loudspeaker.model().ratedOhms());
    } else if (device instanceof CarrierGenerator) {
      return new CarrierGeneratorLaw(seat);
    } else if (device instanceof TunedFeed) {
      return new TunedFeedLaw(seat);
    } else if (device instanceof Transformer) {
      return new TransformerLaw(seat);
    } else if (device instanceof Battery) {
      return new SourceLaw(seat, HUM_HERTZ, 0, 0);
    } else if (device instanceof Adaptor adaptor) {
      AdaptorModel model = adaptor.model();
      double at = model.regulated() ? 0 : model.ratedAmperes();
      return new SourceLaw(seat, model.rippleHertz(), model.rippleVolts(), at);
    } else if (device instanceof Regulator regulator) {
      return new RegulatorLaw(seat, regulator.model());
    }
    return active(device, seat, around);
  }

  private static Law active(Device device, Seat seat, Surroundings around) {
    if (device instanceof Diode diode) {
      return new DiodeLaw(seat, diode.model(), around.nextDiode(), around.driven(seat.name()));
    } else if (device instanceof BipolarTransistor transistor) {
      return new BipolarLaw(seat, transistor.model(), around.driven(seat.name()));
    } else if (device instanceof FieldEffectTransistor transistor) {
      return new FieldEffectLaw(seat, transistor.model(), around.driven(seat.name()));
    } else if (device instanceof OperationalAmplifier opAmp) {
      return new OpAmpLaw(seat, opAmp.model());
    } else if (device instanceof AudioAmplifier amplifier) {
      String name = seat.name();
      return new AmplifierLaw(
          seat,
          amplifier,
          around.nextAmplifier(),
          around.compensation(name),
          around.bootstrap(name));
    }
    throw new IllegalArgumentException("no law for " + device);
  }
}
