package earward.engine.linear;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.Random;
import org.apache.commons.math3.complex.Complex;
import org.apache.commons.math3.complex.ComplexField;
import org.apache.commons.math3.linear.Array2DRowFieldMatrix;
import org.apache.commons.math3.linear.ArrayFieldVector;
import org.apache.commons.math3.linear.FieldLUDecomposition;
import org.apache.commons.math3.linear.FieldMatrix;
import org.apache.commons.math3.linear.LUDecomposition;
import org.apache.commons.math3.linear.MatrixUtils;
import org.apache.commons.math3.linear.RealMatrix;
import org.junit.jupiter.api.Test;

/** Replayed elimination against Apache Commons Math's LU decompositions. */
class SparseSystemsTest {
  private static final int SIZE = 30;
  private final Random random = new Random(20_261_201);

  @Test
  void realSystemsAgreeWithTheLibrary() {
    RealLu lu = new RealLu(SIZE);
    boolean[] pattern = pattern();
    for (int round = 0; round < 40; round++) {
      if (round == 5) {
        lu.freeze();
      }
      RealMatrix matrix = MatrixUtils.createRealMatrix(SIZE, SIZE);
      lu.clear();
      for (int at = 0; at < pattern.length; at++) {
        if (pattern[at]) {
          double value = value(at);
          matrix.addToEntry(at / SIZE, at % SIZE, value);
          lu.add(at / SIZE, at % SIZE, value);
        }
      }
      double[] side = random.doubles(SIZE, -1, 1).toArray();
      double[] wanted =
          new LUDecomposition(matrix, 0)
              .getSolver()
              .solve(MatrixUtils.createRealVector(side))
              .toArray();
      assertThat(lu.factor()).isTrue();
      lu.solve(side);
      assertThat(side).containsExactly(wanted, within(1e-8));
    }
    assertThat(lu.fallBacks()).isZero();
  }

  @Test
  void complexSystemsAndTheirTransposesAgreeWithTheLibrary() {
    ComplexLu lu = new ComplexLu(SIZE);
    boolean[] pattern = pattern();
    for (int round = 0; round < 20; round++) {
      FieldMatrix<Complex> matrix =
          new Array2DRowFieldMatrix<>(ComplexField.getInstance(), SIZE, SIZE);
      lu.clear();
      for (int at = 0; at < pattern.length; at++) {
        if (pattern[at]) {
          Complex value = new Complex(value(at), random.nextGaussian());
          matrix.addToEntry(at / SIZE, at % SIZE, value);
          lu.add(at / SIZE, at % SIZE, value.getReal(), value.getImaginary());
        }
      }
      assertThat(lu.factor()).isTrue();
      compare(lu, matrix, false);
      compare(lu, matrix.transpose(), true);
    }
    assertThat(lu.fallBacks()).isZero();
  }

  @Test
  void anElementOutsideAFrozenPatternIsSolvedDenselyAndCounted() {
    ComplexLu lu = new ComplexLu(2);
    fill(lu, 0);
    lu.freeze();
    for (double cross : new double[] {3, 0}) {
      fill(lu, cross);
      double[] re = {1, 4};
      double[] im = {0, 0};
      lu.solveTransposed(re, im);
      assertThat(re[1]).isEqualTo(1, within(1e-15));
      assertThat(re[0]).isEqualTo((1 - cross) / 2, within(1e-15));
    }
    assertThat(lu.fallBacks()).isEqualTo(1);
  }

  @Test
  void aPivotThatVanishesFallsBackToPivotingByMagnitude() {
    RealLu lu = new RealLu(2);
    for (double corner : new double[] {5, 0}) {
      lu.clear();
      lu.add(0, 0, corner);
      lu.add(0, 1, 1);
      lu.add(1, 0, 1);
      lu.add(1, 1, 1);
      assertThat(lu.factor()).isTrue();
      lu.freeze();
      double[] side = {1, 2};
      lu.solve(side);
      double second = (2 * corner - 1) / (corner - 1);
      assertThat(side).containsExactly(new double[] {2 - second, second}, within(1e-12));
    }
    assertThat(lu.fallBacks()).isEqualTo(1);
  }

  private static void fill(ComplexLu lu, double cross) {
    lu.clear();
    lu.add(0, 0, 2, 0);
    lu.add(1, 1, 4, 0);
    if (cross != 0) {
      lu.add(1, 0, cross, 0);
    }
    assertThat(lu.factor()).isTrue();
  }

  private void compare(ComplexLu lu, FieldMatrix<Complex> matrix, boolean transposed) {
    double[] re = random.doubles(SIZE, -1, 1).toArray();
    double[] im = random.doubles(SIZE, -1, 1).toArray();
    Complex[] side = new Complex[SIZE];
    for (int i = 0; i < SIZE; i++) {
      side[i] = new Complex(re[i], im[i]);
    }
    Complex[] wanted =
        new FieldLUDecomposition<>(matrix)
            .getSolver()
            .solve(new ArrayFieldVector<>(side))
            .toArray();
    if (transposed) {
      lu.solveTransposed(re, im);
    } else {
      lu.solve(re, im);
    }
    for (int i = 0; i < SIZE; i++) {
      assertThat(re[i]).isEqualTo(wanted[i].getReal(), within(1e-8));
      assertThat(im[i]).isEqualTo(wanted[i].getImaginary(), within(1e-8));
    }
  }

  /** A ladder with some bridges and branch rows that have nothing on their diagonal. */
  private boolean[] pattern() {
    boolean[] used = new boolean[SIZE * SIZE];
    for (int i = 0; i < SIZE; i++) {
      int next = (i + 1) % SIZE;
      used[i * SIZE + next] = true;
      used[next * SIZE + i] = true;
      used[i * SIZE + i] = i % 7 != 3;
    }
    for (int i = 0; i < SIZE / 2; i++) {
      int one = random.nextInt(SIZE);
      int other = random.nextInt(SIZE);
      used[one * SIZE + other] |= one != other;
    }
    return used;
  }

  private double value(int at) {
    double sign = random.nextBoolean() ? 1 : -1;
    return at / SIZE == at % SIZE ? 4 + random.nextDouble() : sign * (0.5 + random.nextDouble());
  }
}
