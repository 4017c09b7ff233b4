package earward.desktop.model;

import earward.block.device.Battery;
import earward.block.device.BatteryModel;
import earward.block.figure.CaseName;
import earward.block.figure.FigureName;
import earward.block.figure.Quantity;
import earward.drawing.curve.CurvePlot;
import earward.drawing.curve.CurvePlot.Axis;
import earward.drawing.curve.CurvePlot.Curve;
import earward.drawing.curve.CurvePlot.Kind;
import earward.drawing.curve.CurvePlot.Point;
import earward.engine.CircuitException;
import earward.engine.CircuitPart;
import earward.engine.Slot;
import earward.engine.SweptFigures;
import earward.kit.design.KitDesign;
import earward.kit.path.Assembler;
import earward.kit.path.Assembly;
import earward.kit.path.BatteryLife;
import earward.kit.path.CompiledKit;
import earward.kit.path.KitSolver;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/**
 * Heat, supply current and battery life over the output, while the received carrier goes from half
 * the weakest to the strongest station.
 *
 * @param heat dissipation of each heated part and supply current over output watts
 * @param life hours over output watts, where a battery supplies the kit
 */
public record SupplyCurves(CurvePlot heat, Optional<CurvePlot> life) {
  private static final int POINTS = 16;

  /** Solves them; empty where the kit is not complete or has no load with an output. */
  public static Optional<SupplyCurves> solved(
      KitDesign design, Workshop workshop, double testWatts) {
    Assembly assembly = Assembler.assemble(design, workshop.types(), workshop.parts());
    if (!assembly.complete() || !(testWatts > 0)) {
      return Optional.empty();
    }
    try {
      return Optional.of(swept(assembly, testWatts));
    } catch (CircuitException | IllegalArgumentException e) {
      return Optional.empty(); // the review says what is wrong with the circuit
    }
  }

  private static SupplyCurves swept(Assembly assembly, double testWatts) {
    CompiledKit kit = KitSolver.compileHeadline(assembly);
    var core = assembly.design().conditions().core();
    double[] at = new double[POINTS];
    double from = core.weakPeakVolts() / 2;
    for (int i = 0; i < POINTS; i++) {
      at[i] = from * Math.pow(core.strongPeakVolts() / from, i / (POINTS - 1.0));
    }
    double[] values = kit.circuit().nominalValues();
    SweptFigures swept = kit.circuit().sweep(values, CaseName.TEST, Slot.CARRIER_PEAK_VOLTS, at);
    double testVolts =
        kit.circuit()
            .sweep(
                values, CaseName.TEST, Slot.CARRIER_PEAK_VOLTS, new double[] {core.testPeakVolts()})
            .rows()
            .get(0)
            .figures()
            .get(column(swept, "path", Quantity.AUDIO_RMS_VOLTS));
    return new Reading(assembly, swept, testWatts / (testVolts * testVolts)).curves();
  }

  private static int column(SweptFigures swept, String place, Quantity quantity) {
    int column = swept.figures().indexOf(new FigureName(place, quantity, CaseName.TEST));
    if (column < 0) {
      throw new IllegalArgumentException("there is no " + quantity.key() + " of " + place);
    }
    return column;
  }

  /** Reads the sweep as curves. */
  private record Reading(Assembly assembly, SweptFigures swept, double wattsPerSquareVolt) {
    SupplyCurves curves() {
      List<Curve> heat = new ArrayList<>();
      List<Curve> life = new ArrayList<>();
      Kind kind = Kind.MAIN;
      for (CircuitPart part : assembly.circuit().parts()) {
        String name = assembly.references().ofPart(part.name()).orElse(part.name());
        FigureName watts = new FigureName(part.name(), Quantity.DISSIPATION_WATTS, CaseName.TEST);
        if (swept.figures().contains(watts)) {
          heat.add(new Curve(Words.of("series.heat", name), over(watts), kind));
          kind = Kind.SECOND;
        }
        FigureName amperes = new FigureName(part.name(), Quantity.SUPPLY_AMPERES, CaseName.TEST);
        if (part.device() instanceof Battery battery && swept.figures().contains(amperes)) {
          BatteryModel model = battery.model();
          life.add(
              new Curve(
                  Words.of("series.life", name),
                  over(amperes).stream()
                      .map(p -> new Point(p.across(), BatteryLife.hours(model, p.up())))
                      .toList(),
                  Kind.MAIN));
        }
      }
      Axis across = new Axis(Words.of("axis.output-power"), "W", true, true);
      CurvePlot heatPlot =
          new CurvePlot(
              Words.of("curve.heat"),
              across,
              new Axis(Words.of("axis.heat"), "W", false, true),
              heat,
              List.of());
      CurvePlot lifePlot =
          new CurvePlot(
              Words.of("curve.life"),
              across,
              new Axis(Words.of("axis.life"), "h", false, false),
              life,
              List.of());
      return new SupplyCurves(heatPlot, life.isEmpty() ? Optional.empty() : Optional.of(lifePlot));
    }

    private List<Point> over(FigureName name) {
      int volts = column(swept, "path", Quantity.AUDIO_RMS_VOLTS);
      int column = swept.figures().indexOf(name);
      List<Point> points = new ArrayList<>();
      double last = 0;
      for (SweptFigures.Row row : swept.rows()) {
        double v = row.figures().get(volts);
        double watts = v * v * wattsPerSquareVolt;
        if (watts > last && Double.isFinite(row.figures().get(column))) {
          points.add(new Point(watts, row.figures().get(column)));
          last = watts;
        }
      }
      return points;
    }
  }
}
