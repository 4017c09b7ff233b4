package earward.desktop.model;

import earward.block.Conditions;
import earward.block.figure.Quantity;
import earward.drawing.curve.CurvePlot;
import earward.drawing.curve.CurvePlot.Axis;
import earward.drawing.curve.CurvePlot.Curve;
import earward.drawing.curve.CurvePlot.Kind;
import earward.drawing.curve.CurvePlot.Limit;
import earward.drawing.curve.CurvePlot.Point;
import earward.engine.Response;
import earward.engine.SweptFigures;
import earward.kit.design.KitDesign;
import earward.kit.path.KitCurves;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.Function;
import java.util.function.ToDoubleFunction;

/** The curves of a kit as plots, with those of the baseline as ghosts. */
public final class CurveSet {
  private static final double HALF_POWER_DECIBELS = -3;

  private final KitDesign design;
  private final KitCurves curves;
  private final Optional<KitCurves> before;

  private CurveSet(KitDesign design, KitCurves curves, Optional<KitCurves> before) {
    this.design = design;
    this.curves = curves;
    this.before = before;
  }

  /** The plots, in the order in which they are offered. */
  public static List<CurvePlot> of(
      KitDesign design, KitCurves curves, Optional<KitCurves> baseline) {
    CurveSet set = new CurveSet(design, curves, baseline);
    List<CurvePlot> plots = new ArrayList<>();
    plots.add(set.response());
    plots.add(set.envelope());
    plots.add(set.distortion(KitCurves::depth, "curve.depth", share("axis.depth")));
    plots.add(set.distortion(KitCurves::level, "curve.level", level()));
    plots.add(set.distortion(KitCurves::tone, "curve.tone", hertz("axis.tone")));
    for (int i = 0; i < curves.knobs().size(); i++) {
      int knob = i;
      plots.add(
          set.output(
              all -> knob < all.knobs().size() ? all.knobs().get(knob) : all.level(),
              Words.of("curve.knob", curves.knobs().get(i).slot().replaceAll("\\..*", ""))));
    }
    return plots;
  }

  private Conditions core() {
    return design.conditions().core();
  }

  private static Axis hertz(String key) {
    return new Axis(Words.of(key), "Hz", true, true);
  }

  private static Axis share(String key) {
    return new Axis(Words.of(key), "%", false, false);
  }

  private static Axis level() {
    return new Axis(Words.of("axis.carrier"), "V", true, true);
  }

  private CurvePlot response() {
    List<Curve> lines = new ArrayList<>();
    lines.add(new Curve(Words.of("series.response"), decibels(curves.response()), Kind.MAIN));
    before.ifPresent(
        old ->
            lines.add(
                new Curve(Words.of("series.baseline"), decibels(old.response()), Kind.GHOST)));
    return new CurvePlot(
        Words.of("curve.response"),
        hertz("axis.frequency"),
        new Axis(
            Words.of(
                "axis.relative", Amounts.of(core().toneHertz(), earward.block.quantity.Unit.HERTZ)),
            "dB",
            false,
            false),
        lines,
        List.of(
            new Limit(Words.of("limit.half-power"), HALF_POWER_DECIBELS, false),
            new Limit(Words.of("limit.lowest"), core().lowestToneHertz(), true),
            new Limit(Words.of("limit.highest"), core().highestToneHertz(), true)));
  }

  /** The response over that at the test tone. */
  private List<Point> decibels(Response response) {
    double at = 0;
    double nearest = Double.POSITIVE_INFINITY;
    for (Response.Point point : response.points()) {
      double off = Math.abs(Math.log(point.hertz() / core().toneHertz()));
      if (off < nearest) {
        nearest = off;
        at = point.magnitude();
      }
    }
    double reference = at;
    return response.points().stream()
        .map(p -> new Point(p.hertz(), 20 * Math.log10(p.magnitude() / reference)))
        .toList();
  }

  /** What is recovered of the envelope, beside what would be were it followed at every depth. */
  private CurvePlot envelope() {
    List<Point> recovered = points(curves.depth(), Quantity.AUDIO_RMS_VOLTS, 100, 1);
    List<Curve> lines = new ArrayList<>();
    lines.add(new Curve(Words.of("series.recovered"), recovered, Kind.MAIN));
    if (!recovered.isEmpty()) {
      double slope = recovered.get(0).up() / recovered.get(0).across();
      List<Point> ideal =
          recovered.stream().map(p -> new Point(p.across(), slope * p.across())).toList();
      lines.add(new Curve(Words.of("series.true"), ideal, Kind.SECOND));
    }
    before.ifPresent(
        old ->
            lines.add(
                new Curve(
                    Words.of("series.baseline"),
                    points(old.depth(), Quantity.AUDIO_RMS_VOLTS, 100, 1),
                    Kind.GHOST)));
    return new CurvePlot(
        Words.of("curve.envelope"),
        share("axis.depth"),
        new Axis(Words.of("axis.output"), "V", false, true),
        lines,
        List.of(deepest()));
  }

  private Limit deepest() {
    return new Limit(Words.of("limit.deepest"), core().deepestDepth() * 100, true);
  }

  private CurvePlot distortion(Function<KitCurves, SweptFigures> which, String key, Axis across) {
    double scale = across.unit().equals("%") ? 100 : 1;
    List<Curve> lines = new ArrayList<>();
    SweptFigures swept = which.apply(curves);
    lines.add(line("series.distortion", swept, Quantity.DISTORTION, scale, Kind.MAIN));
    lines.add(line("series.second", swept, Quantity.SECOND_HARMONIC, scale, Kind.SECOND));
    lines.add(line("series.third", swept, Quantity.THIRD_HARMONIC, scale, Kind.THIRD));
    before.ifPresent(
        old ->
            lines.add(
                line("series.baseline", which.apply(old), Quantity.DISTORTION, scale, Kind.GHOST)));
    List<Limit> limits = new ArrayList<>();
    limits.add(
        new Limit(
            Words.of("limit.wanted"), design.conditions().wanted().distortion() * 100, false));
    if (across.unit().equals("%")) {
      limits.add(deepest());
    }
    return new CurvePlot(Words.of(key), across, share("axis.distortion"), lines, limits);
  }

  private CurvePlot output(Function<KitCurves, SweptFigures> which, String title) {
    List<Curve> lines = new ArrayList<>();
    lines.add(
        new Curve(
            Words.of("series.output"),
            points(which.apply(curves), Quantity.AUDIO_RMS_VOLTS, 100, 1),
            Kind.MAIN));
    before.ifPresent(
        old ->
            lines.add(
                new Curve(
                    Words.of("series.baseline"),
                    points(which.apply(old), Quantity.AUDIO_RMS_VOLTS, 100, 1),
                    Kind.GHOST)));
    return new CurvePlot(
        title,
        share("axis.knob"),
        new Axis(Words.of("axis.output"), "V", false, true),
        lines,
        List.of());
  }

  private static Curve line(
      String key, SweptFigures swept, Quantity quantity, double scale, Kind kind) {
    return new Curve(Words.of(key), points(swept, quantity, scale, 100), kind);
  }

  private static List<Point> points(
      SweptFigures swept, Quantity quantity, double acrossScale, double upScale) {
    int column = -1;
    for (int i = 0; i < swept.figures().size(); i++) {
      if (swept.figures().get(i).quantity() == quantity) {
        column = i;
      }
    }
    if (column < 0) {
      return List.of();
    }
    int index = column;
    ToDoubleFunction<SweptFigures.Row> up = row -> row.figures().get(index) * upScale;
    return swept.rows().stream()
        .map(row -> new Point(row.at() * acrossScale, up.applyAsDouble(row)))
        .filter(point -> Double.isFinite(point.up()))
        .toList();
  }
}
