package earward.kit.parts;

import earward.block.device.OutputSwing;
import earward.block.quantity.Unit;
import earward.kit.design.QuantityText;
import java.util.Arrays;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.OptionalDouble;

/**
 * What an amplifier IC loses of its supply, Vsat0 + Rsat·Ipeak from rail to rail, fitted to the
 * output powers of its data sheet.
 *
 * <p>Each power gives a peak voltage at the edge of clipping (hard, even clipping of a sine) and so
 * what is lost: Vs − 2·Vclip from one output, Vs − Vclip from a bridge. Linear least squares over
 * the peak current, each power weighted so that its relative misfit counts; neither figure falls
 * below 0.
 *
 * @param lostVolts Vsat0 of both sides together
 * @param lostOhms Rsat of both sides together
 * @param report how well it fits
 */
public record SwingFit(double lostVolts, double lostOhms, FitReport report) {
  /** Fewest typical powers that fix two figures. */
  public static final int LEAST_POINTS = 2;

  /**
   * The fit to the typical powers.
   *
   * @param bridge whether the load lies between two outputs
   * @throws IllegalArgumentException when fewer than two of them are typical, when all have the
   *     same peak current, or when one is more than the supply can give
   */
  public static SwingFit of(List<OutputPower> powers, boolean bridge) {
    List<OutputPower> used = powers.stream().filter(OutputPower::typical).toList();
    if (used.size() < LEAST_POINTS) {
      throw new IllegalArgumentException(
          "there are " + used.size() + " typical output powers; a fit wants at least 2");
    }
    used.forEach(power -> requirePossible(power, bridge));
    requireSpread(used);
    Line line = Line.through(used, bridge);
    return new SwingFit(line.volts(), line.ohms(), report(used, line, bridge));
  }

  /**
   * The loss shared out so that a sine clips at both sides at once.
   *
   * @param restOffsetVolts how far above half of the supply the output rests
   * @param withoutBootstrapVolts lost upwards in addition where the bootstrap is left out
   */
  public OutputSwing swing(double restOffsetVolts, double withoutBootstrapVolts) {
    double down = Math.min(lostVolts, Math.max(0, lostVolts / 2 + restOffsetVolts));
    return new OutputSwing(
        lostVolts - down, lostOhms / 2, down, lostOhms / 2, withoutBootstrapVolts);
  }

  private static void requireSpread(List<OutputPower> used) {
    double[] amperes = used.stream().mapToDouble(p -> p.clipVolts() / p.loadOhms()).toArray();
    double least = Arrays.stream(amperes).min().orElse(0);
    double most = Arrays.stream(amperes).max().orElse(0);
    if (most < 1.1 * least) {
      throw new IllegalArgumentException(
          "all typical output powers have about the same peak current, "
              + written(most, Unit.AMPERE)
              + "; a fit wants different ones");
    }
  }

  private static void requirePossible(OutputPower power, boolean bridge) {
    double most = power.supplyVolts() / sides(bridge);
    if (power.clipVolts() >= most) {
      throw new IllegalArgumentException(
          written(power)
              + " would need "
              + written(power.clipVolts(), Unit.VOLT)
              + " peak; the supply gives "
              + written(most, Unit.VOLT)
              + " at most, so look at supply, load and power again");
    }
  }

  private static double sides(boolean bridge) {
    return bridge ? 1 : 2;
  }

  private static FitReport report(List<OutputPower> used, Line line, boolean bridge) {
    StringBuilder sentence =
        new StringBuilder(
            "What the amplifier loses of its supply is fitted to "
                + used.size()
                + " typical output powers ");
    OptionalDouble residual = OptionalDouble.empty();
    if (used.size() > LEAST_POINTS) {
      double misfit = Outlier.rms(used, power -> line.misfit(power, bridge));
      residual = OptionalDouble.of(misfit);
      sentence.append("to within " + written(misfit, Unit.FRACTION) + " rms of the power");
    } else {
      sentence.append("exactly, so that nothing tells how well");
    }
    double most = used.stream().mapToDouble(p -> p.clipVolts() / p.loadOhms()).max().orElse(0);
    sentence.append("; extrapolated above " + written(most, Unit.AMPERE) + " peak");
    Optional<Outlier<OutputPower>> outlier =
        Outlier.of(
            used,
            LEAST_POINTS,
            others -> {
              Line without = Line.through(others, bridge);
              return power -> without.misfit(power, bridge);
            });
    outlier.ifPresent(
        found ->
            sentence.append(
                "; look at "
                    + written(found.point())
                    + " again, it lies "
                    + found.off()
                    + " what the others say"));
    return new FitReport(
        used.size(), residual, outlier.isPresent(), sentence.append('.').toString());
  }

  private static String written(OutputPower power) {
    return written(power.watts(), Unit.WATT)
        + " into "
        + written(power.loadOhms(), Unit.OHM)
        + " from "
        + written(power.supplyVolts(), Unit.VOLT);
  }

  private static String written(double number, Unit unit) {
    return QuantityText.format(number, unit, Locale.ROOT);
  }

  /** Lost voltage over peak current. */
  private record Line(double volts, double ohms) {

    static Line through(List<OutputPower> powers, boolean bridge) {
      double sum = 0;
      double sumX = 0;
      double sumY = 0;
      double sumXx = 0;
      double sumXy = 0;
      for (OutputPower power : powers) {
        double clip = power.clipVolts();
        double weight = 1 / (clip * clip);
        double x = clip / power.loadOhms();
        double y = power.supplyVolts() - sides(bridge) * clip;
        sum += weight;
        sumX += weight * x;
        sumY += weight * y;
        sumXx += weight * x * x;
        sumXy += weight * x * y;
      }
      double spread = sum * sumXx - sumX * sumX;
      if (!(spread > 1e-6 * sum * sumXx)) {
        return new Line(Math.max(0, sumY / sum), 0);
      }
      double ohms = (sum * sumXy - sumX * sumY) / spread;
      double volts = (sumY - ohms * sumX) / sum;
      if (ohms < 0) {
        return new Line(Math.max(0, sumY / sum), 0);
      }
      return volts < 0 ? new Line(0, sumXy / sumXx) : new Line(volts, ohms);
    }

    /** ln of the power that this loss leaves over the one that is stated. */
    double misfit(OutputPower power, boolean bridge) {
      double left = Math.max(1e-3, power.supplyVolts() - volts);
      double clip = left / (sides(bridge) + ohms / power.loadOhms());
      return 2 * Math.log(clip / power.clipVolts());
    }
  }
}
