package earward.sheet.internal.gather;

import earward.block.Role;
import earward.block.device.Adaptor;
import earward.block.device.AudioAmplifier;
import earward.block.device.Battery;
import earward.block.device.Regulator;
import earward.block.figure.CaseName;
import earward.block.figure.FigureName;
import earward.block.figure.Quantity;
import earward.block.quantity.Unit;
import earward.block.wiring.WiredPart;
import earward.kit.path.Assembly;
import earward.kit.path.Figures;
import earward.kit.path.PlacedBlock;
import earward.kit.path.PlacedTestPoint;
import earward.sheet.content.Amount;
import earward.sheet.content.CurrentRow;
import earward.sheet.content.HeatRow;
import earward.sheet.content.LimitRow;
import earward.sheet.content.SeamRow;
import earward.sheet.content.TestPointRow;
import earward.sheet.internal.section.Words;
import earward.study.limits.KitLimits;
import earward.study.limits.PointLimits;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/** The tables of figures: test points, supplies, heat and seams. */
final class FigureRows {
  /** A limit that moves less for a volt of the supply stays within what is rounded away. */
  private static final double LEAST_MOVE = 0.01;

  private final Assembly assembly;
  private final Figures figures;
  private final BlockNames names;
  private final Words words;
  private final KitLimits limits;

  FigureRows(Assembly assembly, Figures figures, BlockNames names, Words words, KitLimits limits) {
    this.limits = limits;
    this.assembly = assembly;
    this.figures = figures;
    this.names = names;
    this.words = words;
  }

  private Amount at(String place, Quantity quantity, CaseName caseName) {
    return Amount.of(figures.find(place, quantity, caseName), quantity.unit());
  }

  List<TestPointRow> testPoints() {
    List<TestPointRow> rows = new ArrayList<>();
    for (PlacedTestPoint point : assembly.testPoints()) {
      String place = point.place();
      rows.add(
          new TestPointRow(
              point.reference(),
              names.testPoint(point),
              at(place, Quantity.DC_VOLTS, CaseName.NO_SIGNAL),
              at(place, Quantity.DC_VOLTS, CaseName.TEST),
              at(place, Quantity.AUDIO_RMS_VOLTS, CaseName.TEST),
              at(place, Quantity.CARRIER_RMS_VOLTS, CaseName.TEST),
              restLimits(place)));
    }
    return rows;
  }

  private Optional<LimitRow> restLimits(String place) {
    return limits
        .of(new FigureName(place, Quantity.DC_VOLTS, CaseName.NO_SIGNAL))
        .filter(PointLimits::readable)
        .map(
            point ->
                new LimitRow(
                    new Amount(point.low(), Unit.VOLT),
                    new Amount(point.high(), Unit.VOLT),
                    Math.abs(point.perSupplyVolt()) < LEAST_MOVE
                        ? Amount.none(Unit.VOLT)
                        : new Amount(point.perSupplyVolt(), Unit.VOLT)));
  }

  List<CurrentRow> currents() {
    List<CurrentRow> rows = new ArrayList<>();
    for (PlacedBlock block : assembly.beside()) {
      for (WiredPart part : block.description().wiring().parts()) {
        if (part.device() instanceof Battery battery) {
          rows.add(current(block, part, battery.model().name()));
        } else if (part.device() instanceof Adaptor adaptor) {
          rows.add(current(block, part, adaptor.model().name()));
        }
      }
    }
    return rows;
  }

  private CurrentRow current(PlacedBlock block, WiredPart part, String type) {
    String place = block.partName(part);
    return new CurrentRow(
        PartRows.reference(assembly, block, part.id()) + "  " + type,
        at(place, Quantity.SUPPLY_AMPERES, CaseName.NO_SIGNAL),
        at(place, Quantity.SUPPLY_AMPERES, CaseName.TEST),
        at(place, Quantity.SUPPLY_AMPERES, CaseName.FULL_OUTPUT),
        at(place, Quantity.SUPPLY_AMPERES, CaseName.HOTTEST),
        at(place, Quantity.BATTERY_HOURS, CoverFigures.LISTENING));
  }

  List<HeatRow> heat() {
    List<HeatRow> rows = new ArrayList<>();
    for (PlacedBlock block : assembly.blocks()) {
      for (WiredPart part : block.description().wiring().parts()) {
        if (part.device() instanceof AudioAmplifier amplifier) {
          double limit = amplifier.model().ratings().mostJunctionCelsius();
          double sink = amplifier.heatSinkKelvinPerWatt();
          rows.add(heat(block, part, amplifier.model().name(), limit, sink));
        } else if (part.device() instanceof Regulator regulator) {
          double limit = regulator.model().mostJunctionCelsius();
          rows.add(heat(block, part, regulator.model().name(), limit, Double.POSITIVE_INFINITY));
        }
      }
    }
    return rows;
  }

  private HeatRow heat(PlacedBlock block, WiredPart part, String type, double limit, double sink) {
    String place = block.partName(part);
    return new HeatRow(
        PartRows.reference(assembly, block, part.id()) + "  " + type,
        at(place, Quantity.DISSIPATION_WATTS, CaseName.TEST),
        at(place, Quantity.DISSIPATION_WATTS, CaseName.HOTTEST),
        at(place, Quantity.JUNCTION_CELSIUS, CaseName.HOTTEST),
        new Amount(limit, Unit.CELSIUS),
        at(place, Quantity.SURFACE_CELSIUS, CaseName.HOTTEST),
        new Amount(sink, Unit.KELVIN_PER_WATT));
  }

  List<SeamRow> seams() {
    List<SeamRow> rows = new ArrayList<>();
    boolean detected = false;
    for (int i = 1; i < assembly.path().size(); i++) {
      PlacedBlock left = assembly.path().get(i - 1);
      PlacedBlock right = assembly.path().get(i);
      detected |= left.type().role() == Role.DETECTOR;
      rows.add(detected ? audioSeam(left, right) : carrierSeam(left, right));
    }
    return rows;
  }

  private SeamRow audioSeam(PlacedBlock left, PlacedBlock right) {
    String place = "seam." + right.id();
    return seam(
        left,
        right,
        "",
        at(place, Quantity.AUDIO_RMS_VOLTS, CaseName.TEST),
        at(place, Quantity.DISTORTION, CaseName.TEST));
  }

  /** Before the detector there is only the carrier; what it presents is not an audio impedance. */
  private SeamRow carrierSeam(PlacedBlock left, PlacedBlock right) {
    return seam(
        left,
        right,
        words.text("seams.carrier"),
        at("seam." + right.id(), Quantity.CARRIER_RMS_VOLTS, CaseName.TEST),
        Amount.none(Unit.FRACTION));
  }

  private SeamRow seam(
      PlacedBlock left, PlacedBlock right, String note, Amount level, Amount distortion) {
    String place = "seam." + right.id();
    boolean pair = figures.find(place + ".plus", Quantity.ONWARD_OHMS, CaseName.TEST).isPresent();
    String wire = pair ? place + ".plus" : place;
    return new SeamRow(
        names.of(left),
        names.of(right),
        pair ? words.text("seams.pair") : note,
        level,
        distortion,
        at(wire, Quantity.BACKWARD_OHMS, CaseName.TEST),
        at(wire, Quantity.ONWARD_OHMS, CaseName.TEST),
        at(wire, Quantity.LOADING_LOSS_DECIBELS, CaseName.TEST),
        at(place, Quantity.HEADROOM_DECIBELS, CaseName.TEST));
  }
}
