package earward.study.batch;

import earward.block.device.Battery;
import earward.block.device.BatteryModel;
import earward.block.device.Capacitor;
import earward.block.device.Device;
import earward.block.device.Dielectric;
import earward.block.device.Diode;
import earward.block.device.Loudspeaker;
import earward.block.device.Parameter;
import earward.block.device.ToleranceClass;
import earward.engine.Circuit;
import earward.engine.CircuitPart;
import earward.engine.CompiledCircuit;
import earward.engine.Slot;
import earward.kit.design.Tolerances;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;

/**
 * Draws the values of a kit by its number. Immutable; shared by all threads.
 *
 * <p>Passive parts lie evenly within their tolerance; saturation currents evenly in the logarithm
 * within the band of their own model, or by the factor of their class. Ceramic capacitors also move
 * with the room's temperature: class 1 by ±30 ppm/K (C0G, IEC 60384-8), class 2 by ±15 % over 100 K
 * (X7R, IEC 60384-9, both from memory).
 */
public final class KitDraw {
  /** From here on a ceramic capacitor counts as one of class 2 (common practice), in F. */
  private static final double CLASS_TWO_FARADS = 0.999e-9;

  private static final double CLASS_ONE_PER_KELVIN = 30e-6;
  private static final double CLASS_TWO_PER_KELVIN = 0.15 / 100;
  private static final double SPECIFIED_CELSIUS = 25;
  private static final String VOLTS = ":volts";

  private record Ceramic(int slot, double perKelvin, long stream) {}

  private record Cells(int volts, int ohms, BatteryModel model, long stream) {}

  private final double[] nominal;
  private final List<DrawnValue> values;
  private final List<Ceramic> ceramics;
  private final List<Cells> batteries;
  private final int ambientSlot;
  private final double ambientCelsius;
  private final Habits habits;

  private KitDraw(KitDraw from, List<DrawnValue> values, Habits habits) {
    nominal = from.nominal;
    this.values = List.copyOf(values);
    ceramics = from.ceramics;
    batteries = from.batteries;
    ambientSlot = from.ambientSlot;
    ambientCelsius = from.ambientCelsius;
    this.habits = habits;
  }

  /**
   * The draw of a circuit.
   *
   * @param circuit its parts
   * @param compiled its slots
   * @param tolerances of the design
   * @param ambientCelsius usual ambient
   * @param habits what is taken for granted beside
   */
  public KitDraw(
      Circuit circuit,
      CompiledCircuit compiled,
      Tolerances tolerances,
      double ambientCelsius,
      Habits habits) {
    this.ambientCelsius = ambientCelsius;
    this.habits = habits;
    ambientSlot = compiled.slot(Slot.AMBIENT_CELSIUS);
    nominal = compiled.nominalValues();
    nominal[ambientSlot] = ambientCelsius;
    List<DrawnValue> drawn = new ArrayList<>();
    List<Ceramic> ofCeramic = new ArrayList<>();
    List<Cells> cells = new ArrayList<>();
    for (CircuitPart part : circuit.parts()) {
      for (Parameter parameter : part.device().parameters()) {
        double share = share(part, parameter, tolerances);
        if (share > 0) {
          drawn.add(value(part, parameter, share, compiled));
        }
      }
      if (part.device() instanceof Capacitor capacitor
          && capacitor.dielectric() == Dielectric.CERAMIC) {
        ofCeramic.add(ceramic(part.name(), capacitor, compiled));
      } else if (part.device() instanceof Battery battery) {
        cells.add(cells(part.name(), battery.model(), compiled));
      }
    }
    values = List.copyOf(drawn);
    ceramics = List.copyOf(ofCeramic);
    batteries = List.copyOf(cells);
  }

  private static double share(CircuitPart part, Parameter parameter, Tolerances tolerances) {
    ToleranceClass kind = parameter.tolerance();
    if (kind == ToleranceClass.FIXED || !Double.isFinite(parameter.nominal())) {
      return 0;
    }
    boolean said =
        tolerances.byPart().containsKey(part.name()) || tolerances.byClass().containsKey(kind);
    if (!said
        && part.device() instanceof Loudspeaker loudspeaker
        && parameter.name().equals("dc-ohms")) {
      return loudspeaker.model().dcToleranceFraction();
    }
    return tolerances.fraction(kind, part.name());
  }

  private static DrawnValue value(
      CircuitPart part, Parameter parameter, double share, CompiledCircuit compiled) {
    String name = part.name() + ":" + parameter.name();
    String like = part.device().getClass().getSimpleName() + parameter.name() + parameter.nominal();
    return new DrawnValue(
        compiled.slot(name),
        name,
        part.name(),
        spread(part.device(), parameter, share),
        Chance.stream(name),
        Chance.stream(like));
  }

  private static Spread spread(Device device, Parameter parameter, double share) {
    if (parameter.tolerance() != ToleranceClass.SATURATION_CURRENT) {
      return new Spread.Within(parameter.nominal(), share);
    }
    if (device instanceof Diode diode
        && diode.model().saturationMostAmperes() > diode.model().saturationLeastAmperes()
        && diode.model().saturationLeastAmperes() > 0) {
      return new Spread.Band(
          diode.model().saturationLeastAmperes(), diode.model().saturationMostAmperes());
    }
    return new Spread.Band(parameter.nominal() / (1 + share), parameter.nominal() * (1 + share));
  }

  private static Ceramic ceramic(String part, Capacitor capacitor, CompiledCircuit compiled) {
    return new Ceramic(
        compiled.slot(part + ":farads"),
        capacitor.farads() < CLASS_TWO_FARADS ? CLASS_ONE_PER_KELVIN : CLASS_TWO_PER_KELVIN,
        Chance.stream(part + ":temperature"));
  }

  private static Cells cells(String part, BatteryModel model, CompiledCircuit compiled) {
    return new Cells(
        compiled.slot(part + VOLTS),
        compiled.slot(part + ":internal-ohms"),
        model,
        Chance.stream(part + ":state"));
  }

  /** All values that are drawn by a tolerance. */
  public List<DrawnValue> values() {
    return values;
  }

  /** This draw with other spreads for some of its values; all random numbers stay. */
  public KitDraw with(List<DrawnValue> changed) {
    return new KitDraw(this, changed, habits);
  }

  /** This draw with other habits. */
  public KitDraw with(Habits other) {
    return new KitDraw(this, values, other);
  }

  /**
   * What a kit draws for each value, from −1 (one end of its spread) to 1 (the other), in the order
   * of the values.
   */
  public double[] draws(long seed, long kit) {
    double[] draws = new double[values.size()];
    for (int i = 0; i < draws.length; i++) {
      draws[i] = draw(seed, kit, values.get(i));
    }
    return draws;
  }

  private double draw(long seed, long kit, DrawnValue value) {
    double own = Chance.evenly(seed, kit, value.stream());
    double common = Chance.evenly(~seed, kit / habits.kitsPerLot(), value.lotStream());
    return habits.lotShare() * common + (1 - habits.lotShare()) * own;
  }

  /** A fresh row of the nominal kit, at the usual ambient. */
  public double[] nominal() {
    return Arrays.copyOf(nominal, nominal.length);
  }

  /**
   * The row of a kit.
   *
   * @param seed of the batch
   * @param kit its number, at least 0
   * @param row receives the values
   */
  public void draw(long seed, long kit, double[] row) {
    System.arraycopy(nominal, 0, row, 0, nominal.length);
    for (DrawnValue value : values) {
      row[value.slot()] = value.spread().at(draw(seed, kit, value));
    }
    for (Cells cells : batteries) {
      double used = habits.batteryUsed() * Chance.unit(seed, kit, cells.stream());
      BatteryModel model = cells.model();
      row[cells.volts()] *= 1 - used * (1 - model.endVolts() / model.newVolts());
      row[cells.ohms()] += used * (model.endOhms() - model.newOhms());
    }
    double celsius =
        ambientCelsius
            + habits.ambientKelvin()
                * Chance.evenly(seed, kit, Chance.stream(Slot.AMBIENT_CELSIUS));
    row[ambientSlot] = celsius;
    for (Ceramic ceramic : ceramics) {
      double coefficient = ceramic.perKelvin() * Chance.evenly(seed, kit, ceramic.stream());
      row[ceramic.slot()] *= 1 + coefficient * (celsius - SPECIFIED_CELSIUS);
    }
  }
}
