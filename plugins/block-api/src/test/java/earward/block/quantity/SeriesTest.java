package earward.block.quantity;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;
import static org.assertj.core.api.Assertions.within;

import java.util.Arrays;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.EnumSource;
import org.junit.jupiter.params.provider.ValueSource;

/** The preferred values against IEC 60063:2015, whose lists stand here from memory, in full. */
class SeriesTest {
  private static final String E6 = "10 15 22 33 47 68";
  private static final String E12 = "10 12 15 18 22 27 33 39 47 56 68 82";
  private static final String E24 =
      "10 11 12 13 15 16 18 20 22 24 27 30 33 36 39 43 47 51 56 62 68 75 82 91";
  private static final String E96 =
      "100 102 105 107 110 113 115 118 121 124 127 130 133 137 140 143 147 150 154 158 162 165 169"
          + " 174 178 182 187 191 196 200 205 210 215 221 226 232 237 243 249 255 261 267 274 280"
          + " 287 294 301 309 316 324 332 340 348 357 365 374 383 392 402 412 422 432 442 453 464"
          + " 475 487 499 511 523 536 549 562 576 590 604 619 634 649 665 681 698 715 732 750 768"
          + " 787 806 825 845 866 887 909 931 953 976";

  private static List<Integer> list(String members) {
    return Arrays.stream(members.split(" ")).map(Integer::valueOf).toList();
  }

  @Test
  void theSeriesAreThoseOfTheStandardMemberByMember() {
    assertThat(Series.E6.members()).isEqualTo(list(E6));
    assertThat(Series.E12.members()).isEqualTo(list(E12));
    assertThat(Series.E24.members()).isEqualTo(list(E24));
    assertThat(Series.E96.members()).isEqualTo(list(E96)).hasSize(96);
    assertThat(Series.ANY.members()).isEmpty();
  }

  @ParameterizedTest
  @ValueSource(ints = {27, 30, 33, 36, 39, 43, 47, 82})
  void theMembersThatTheFormulaGetsWrongAreThere(int member) {
    // IEC 60063: E24 does not equal round(10·10^(k/24)); the formula gives 26, 29, 32, 35, 38, 42,
    // 46 and 83 there.
    int k = Series.E24.members().indexOf(member);
    assertThat(Math.round(10 * Math.pow(10, k / 24.0))).isNotEqualTo(member);
    assertThat(Series.E24.contains(member * 100.0)).isTrue();
  }

  @Test
  void aSeriesIsNoPartOfTheFinestOne() {
    // IEC 60063: 82 stands in E12, 820 is no member of E96, where 825 is the nearest.
    assertThat(Series.E96.contains(820)).isFalse();
    assertThat(Series.E96.nearest(820)).isCloseTo(825, within(1e-9));
    assertThat(Series.E12.contains(820)).isTrue();
  }

  @Test
  void theNearestIsTheNearestByRatio() {
    // 1.05 kΩ lies in the middle of 1.0 and 1.1 kΩ by difference; by ratio above it (√1.1 =
    // 1.0488).
    assertThat(Series.E24.nearest(1050)).isCloseTo(1100, within(1e-9));
    assertThat(Series.E24.nearest(1048)).isCloseTo(1000, within(1e-9));
  }

  @ParameterizedTest
  @EnumSource(
      value = Series.class,
      names = {"E6", "E12", "E24", "E96"})
  void stepsGoThroughEveryMemberOfEveryDecadeBothWays(Series series) {
    int size = series.members().size();
    double value = 1e-12;
    for (int i = 0; i < 18 * size; i++) {
      double next = series.next(value);
      assertThat(series.contains(next)).as("%s after %s", next, value).isTrue();
      assertThat(series.previous(next) / value).isCloseTo(1, within(1e-9));
      assertThat(series.nearest(next * 1.0001) / next).isCloseTo(1, within(1e-9));
      value = next;
    }
    assertThat(value / 1e6).isCloseTo(1, within(1e-9));
  }

  @ParameterizedTest
  @CsvSource({"E12, 999, 1000, 820", "E24, 960, 1000, 910", "E6, 4.7e-9, 6.8e-9, 3.3e-9"})
  void betweenMembersAStepLandsOnTheNeighbours(Series series, double at, double up, double down) {
    assertThat(series.next(at) / up).isCloseTo(1, within(1e-9));
    assertThat(series.previous(at) / down).isCloseTo(1, within(1e-9));
  }

  @ParameterizedTest
  @ValueSource(doubles = {0, -1, Double.NaN, Double.POSITIVE_INFINITY})
  void whatIsNoPositiveNumberIsRefused(double value) {
    assertThatIllegalArgumentException().isThrownBy(() -> Series.E12.nearest(value));
    assertThatIllegalArgumentException().isThrownBy(() -> Series.E12.next(value));
  }
}
