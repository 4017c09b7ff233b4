package earward.study.limits;

import earward.block.figure.CaseName;
import earward.block.figure.FigureName;
import earward.block.figure.Quantity;
import earward.kit.path.Assembly;
import earward.kit.path.PlacedTestPoint;
import earward.study.limits.LimitStudy.Loading;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;

/** Makes limits of the readings of drawn kits. Used once. */
final class LimitTable {
  /** Distortion that an audio reading is widened by where none was solved. */
  private static final double USUAL_DISTORTION = 0.05;

  private final Assembly assembly;
  private final List<FigureName> figures;
  private final double[][] columns;
  private final List<Meter> meters;
  private final List<List<Loading>> loadings;
  private final Optional<String> supplyPlace;
  private final double[] slopes;
  private final double[] supplyVolts;

  LimitTable(
      Assembly assembly,
      List<FigureName> figures,
      List<double[]> rows,
      List<Meter> meters,
      List<List<Loading>> loadings) {
    this.assembly = assembly;
    this.figures = figures;
    this.meters = meters;
    this.loadings = loadings;
    columns = new double[figures.size()][rows.size()];
    for (int i = 0; i < columns.length; i++) {
      for (int kit = 0; kit < rows.size(); kit++) {
        columns[i][kit] = rows.get(kit)[i];
      }
    }
    supplyPlace = LimitStudy.supplyPlace(assembly);
    slopes = new double[columns.length];
    supplyVolts = new double[columns.length];
  }

  KitLimits limits() {
    double[][] left = withoutTheSupply();
    int kits = columns[0].length;
    int rank = ToleranceRank.of(kits, KitLimits.WANTED_SHARE);
    JointWidth width = new JointWidth(left, rank);
    List<PointLimits> points = new ArrayList<>();
    for (PlacedTestPoint point : assembly.testPoints()) {
      for (int i = 0; i < columns.length; i++) {
        if (figures.get(i).place().equals(point.place())) {
          points.add(limits(point, i, width));
        }
      }
    }
    return new KitLimits(
        kits,
        ToleranceRank.confidence(kits, rank, KitLimits.WANTED_SHARE),
        supplyPlace,
        supplyPlace.map(place -> supplyNominal()).orElse(0.0),
        points);
  }

  private double supplyNominal() {
    return loadings.get(0).get(supplyColumn(CaseName.NO_SIGNAL)).volts();
  }

  /** Column of the supply reading in a case, −1 where there is none. */
  private int supplyColumn(CaseName caseName) {
    for (int i = 0; i < figures.size(); i++) {
      FigureName figure = figures.get(i);
      if (figure.quantity() == Quantity.DC_VOLTS
          && figure.caseName().equals(caseName)
          && supplyPlace.isPresent()
          && supplyPlace.get().equals(figure.place())) {
        return i;
      }
    }
    return -1;
  }

  /**
   * The readings with what follows from the supply reading taken out: least squares over the kits.
   * The supply's own reading stays as it is.
   */
  private double[][] withoutTheSupply() {
    double[][] left = new double[columns.length][];
    for (int i = 0; i < columns.length; i++) {
      left[i] = columns[i].clone();
      int supply = supplyColumn(figures.get(i).caseName());
      boolean dc = figures.get(i).quantity() == Quantity.DC_VOLTS;
      if (dc && supply >= 0 && supply != i) {
        supplyVolts[i] = loadings.get(0).get(supply).volts();
        slopes[i] = slope(columns[supply], columns[i]);
        for (int kit = 0; kit < left[i].length; kit++) {
          left[i][kit] -= slopes[i] * (columns[supply][kit] - supplyVolts[i]);
        }
      }
    }
    return left;
  }

  private static double slope(double[] x, double[] y) {
    double meanX = Arrays.stream(x).average().orElse(0);
    double meanY = Arrays.stream(y).average().orElse(0);
    double xx = 0;
    double xy = 0;
    for (int i = 0; i < x.length; i++) {
      xx += (x[i] - meanX) * (x[i] - meanX);
      xy += (x[i] - meanX) * (y[i] - meanY);
    }
    return xx > 0 ? xy / xx : 0;
  }

  private PointLimits limits(PlacedTestPoint point, int column, JointWidth width) {
    FigureName figure = figures.get(column);
    String trouble = "";
    for (int i = 0; i < meters.size(); i++) {
      Meter meter = meters.get(i);
      Loading loading = loadings.get(i).get(column);
      String its = trouble(meter, figure, loading);
      if (its.isEmpty()) {
        return read(point, column, width, meter, loading);
      }
      trouble = trouble.isEmpty() ? its : trouble;
    }
    double nominal = loadings.get(0).get(column).volts();
    return new PointLimits(
        point, figure, "", trouble, nominal, Double.NaN, Double.NaN, 0, Double.NaN);
  }

  private String trouble(Meter meter, FigureName figure, Loading loading) {
    if (figure.quantity() == Quantity.DC_VOLTS) {
      return loading.tooMuch() ? "loads-too-much" : "";
    }
    double hertz = assembly.design().conditions().core().toneHertz();
    return meter
        .audioTrouble(hertz, loading.volts())
        .map(AudioTrouble::key)
        .orElse(loading.tooMuch() ? "loads-too-much" : "");
  }

  private PointLimits read(
      PlacedTestPoint point, int column, JointWidth width, Meter meter, Loading loading) {
    boolean dc = figures.get(column).quantity() == Quantity.DC_VOLTS;
    double slope = slopes[column] * loading.left();
    double ofSupply = slope == 0 ? 0 : Math.abs(slope) * meter.errorVolts(supplyVolts[column]);
    double one = width.low(column) * loading.left();
    double other = width.high(column) * loading.left();
    double low = Math.min(one, other);
    double high = Math.max(one, other);
    low -= ofSupply + error(meter, low, dc);
    high += ofSupply + error(meter, high, dc);
    return new PointLimits(
        point,
        figures.get(column),
        meter.instrument().name(),
        "",
        loading.volts() * loading.left(),
        dc ? meter.floor(low) : Math.max(0, low),
        dc ? meter.ceiling(high) : high,
        slope,
        loading.left());
  }

  private static double error(Meter meter, double volts, boolean dc) {
    return dc ? meter.errorVolts(volts) : meter.audioErrorVolts(volts, USUAL_DISTORTION);
  }
}
