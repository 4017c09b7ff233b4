package earward.block.device;

import java.util.List;

/**
 * What a part is, with the figures of its law. The kinds are sealed: each has exactly one law,
 * which the engine knows. A block is free in how it joins them.
 *
 * <p>Immutable. All numbers are in the SI unit that the component's name says.
 */
public sealed interface Device
    permits Resistor,
        Capacitor,
        Inductor,
        Diode,
        Potentiometer,
        CarrierGenerator,
        TunedFeed,
        Transformer,
        BipolarTransistor,
        FieldEffectTransistor,
        OperationalAmplifier,
        AudioAmplifier,
        Loudspeaker,
        MeterMovement,
        Battery,
        Adaptor,
        Regulator,
        Switch,
        Fuse {

  /** The ends of this device, in the order in which a drawing and a parts list name them. */
  List<Terminal> terminals();

  /** The numbers of its law that a solver takes as values. */
  List<Parameter> parameters();

  /** Whether the builder fits it; false for what stands for the world outside the kit. */
  default boolean fitted() {
    return true;
  }

  /**
   * The pins in the order in which they stand side by side, for bridged-neighbour faults and the
   * pin-out; the terminals where nothing else is known.
   */
  default List<Pin> pins() {
    List<Terminal> terminals = terminals();
    return java.util.stream.IntStream.range(0, terminals.size())
        .mapToObj(i -> new Pin(i + 1, terminals.get(i)))
        .toList();
  }
}
