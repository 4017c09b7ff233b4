package earward.timing;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.PrintStream;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.concurrent.atomic.AtomicInteger;
import org.junit.jupiter.api.Test;

class BarsTest {
  private final ByteArrayOutputStream out = new ByteArrayOutputStream();

  @Test
  void aBarThatIsKeptEndsWithZero() {
    assertThat(run(false, new RepeatedBar("idle", 30, 3, () -> {}))).isZero();
    assertThat(out.toString(StandardCharsets.UTF_8)).startsWith("kept").contains("idle");
  }

  @Test
  void oneMissedBarAmongKeptOnesEndsWithOne() {
    RepeatedBar missed = new RepeatedBar("slow", 1e-9, 1, () -> Thread.sleep(2));
    assertThat(run(false, missed, new RepeatedBar("idle", 30, 1, () -> {}))).isEqualTo(1);
    assertThat(out.toString(StandardCharsets.UTF_8)).startsWith("MISSED slow").contains("kept");
  }

  @Test
  void workThatFailsMissesItsBar() {
    RepeatedBar failing =
        new RepeatedBar(
            "broken",
            30,
            1,
            () -> {
              throw new IOException("wet");
            });
    assertThat(run(false, failing)).isEqualTo(1);
    assertThat(out.toString(StandardCharsets.UTF_8)).contains("FAILED broken").contains("wet");
  }

  @Test
  void quickIsAFifthOfTheLengthAgainstTwiceTheTime() throws Exception {
    AtomicInteger runs = new AtomicInteger();
    RepeatedBar bar = new RepeatedBar("counted", 30, 10, runs::incrementAndGet);
    assertThat(bar.measure(true).limitSeconds()).isEqualTo(60);
    assertThat(runs.get()).isEqualTo(1 + 10 / 5);
  }

  @Test
  void whatIsOnlyToldIsNeverMissed() {
    Timed told = new Timed("kits", 0.002, Double.POSITIVE_INFINITY);
    assertThat(told.kept()).isTrue();
    assertThat(told.line()).startsWith("told").contains("2.000 ms").contains("500.0 a second");
  }

  @Test
  void theRatioToTheLimitIsPrinted() {
    assertThat(new Timed("kits", 0.002, 0.008).line()).contains("0.25 of the limit");
    assertThat(new Timed("kits", 0.016, 0.008).line()).startsWith("MISSED").contains("2.00");
  }

  @Test
  void noBarsAtAllAreNoBarsKept() {
    assertThat(run(false)).isEqualTo(1);
  }

  private int run(boolean quick, Bar... bars) {
    return Bars.run(List.of(bars), quick, new PrintStream(out, true, StandardCharsets.UTF_8));
  }
}
