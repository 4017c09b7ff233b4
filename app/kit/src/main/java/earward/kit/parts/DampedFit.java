package earward.kit.parts;

import java.util.List;

/** Damped least squares for the three figures of a {@link DiodeCurve}. Used once. */
final class DampedFit {
  private static final int FIGURES = 3;
  private static final int MOST_STEPS = 400;
  private static final double MOST_DAMPING = 1e12;
  private static final double LEAST_COST = 1e-20;
  private static final double STEP = 1e-6;

  private final List<DiodePoint> points;
  private final double thermalVolts;

  DampedFit(List<DiodePoint> points, double thermalVolts) {
    this.points = points;
    this.thermalVolts = thermalVolts;
  }

  DiodeCurve from(DiodeCurve start) {
    double[] at = {start.logSaturation(), start.emission(), start.seriesOhms()};
    double cost = curve(at).cost(points, thermalVolts);
    double damping = 1e-3;
    for (int k = 0; k < MOST_STEPS && damping < MOST_DAMPING && cost > LEAST_COST; k++) {
      double[] next = clamped(step(at, damping));
      double nextCost = curve(next).cost(points, thermalVolts);
      if (nextCost < cost) {
        at = next;
        cost = nextCost;
        damping = Math.max(1e-12, damping / 4);
      } else {
        damping *= 3;
      }
    }
    return curve(at);
  }

  private static DiodeCurve curve(double[] at) {
    return new DiodeCurve(at[0], at[1], at[2]);
  }

  private static double[] clamped(double[] at) {
    return new double[] {
      Math.max(-80, Math.min(0, at[0])), Math.max(1, Math.min(2, at[1])), Math.max(0, at[2])
    };
  }

  /** (JᵀJ + damping·diag(JᵀJ))·step = −Jᵀr, with differences for J. */
  private double[] step(double[] at, double damping) {
    double[] residuals = curve(at).residuals(points, thermalVolts);
    double[][] slopes = new double[FIGURES][];
    for (int j = 0; j < FIGURES; j++) {
      double width = STEP * Math.max(1, Math.abs(at[j]));
      double[] moved = at.clone();
      moved[j] += width;
      slopes[j] = curve(moved).residuals(points, thermalVolts);
      for (int k = 0; k < residuals.length; k++) {
        slopes[j][k] = (slopes[j][k] - residuals[k]) / width;
      }
    }
    double[][] matrix = new double[FIGURES][FIGURES + 1];
    for (int i = 0; i < FIGURES; i++) {
      for (int j = 0; j < FIGURES; j++) {
        matrix[i][j] = product(slopes[i], slopes[j]);
      }
      matrix[i][FIGURES] = -product(slopes[i], residuals);
    }
    for (int i = 0; i < FIGURES; i++) {
      matrix[i][i] = matrix[i][i] * (1 + damping) + Double.MIN_NORMAL;
    }
    double[] change = solved(matrix);
    for (int j = 0; j < FIGURES; j++) {
      change[j] += at[j];
    }
    return change;
  }

  private static double product(double[] one, double[] other) {
    double sum = 0;
    for (int k = 0; k < one.length; k++) {
      sum += one[k] * other[k];
    }
    return sum;
  }

  /** Elimination of a positive definite system; its pivots lie on the diagonal. */
  private static double[] solved(double[][] matrix) {
    int size = matrix.length;
    for (int i = 0; i < size; i++) {
      for (int row = i + 1; row < size; row++) {
        double factor = matrix[row][i] / matrix[i][i];
        for (int column = i; column <= size; column++) {
          matrix[row][column] -= factor * matrix[i][column];
        }
      }
    }
    double[] solution = new double[size];
    for (int i = size - 1; i >= 0; i--) {
      double sum = matrix[i][size];
      for (int j = i + 1; j < size; j++) {
        sum -= matrix[i][j] * solution[j];
      }
      solution[i] = sum / matrix[i][i];
    }
    return solution;
  }
}
