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
    assertThat(run(false, new Bar("idle", 30, 3, () -> {}))).isZero();
    assertThat(out.toString(StandardCharsets.UTF_8)).startsWith("kept").contains("idle");
  }

  @Test
  void oneMissedBarAmongKeptOnesEndsWithOne() {
    Bar missed = new Bar("slow", 1e-9, 1, () -> Thread.sleep(2));
    assertThat(run(false, missed, new Bar("idle", 30, 1, () -> {}))).isEqualTo(1);
    assertThat(out.toString(StandardCharsets.UTF_8)).startsWith("MISSED slow").contains("kept");
  }

  @Test
  void workThatFailsMissesItsBar() {
    Bar failing =
        new Bar(
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
    Bar bar = new Bar("counted", 30, 10, runs::incrementAndGet);
    assertThat(bar.measure(true).limitSeconds()).isEqualTo(60);
    assertThat(runs.get()).isEqualTo(1 + 10 / 5);
  }

  private int run(boolean quick, Bar... bars) {
    return Bars.run(List.of(bars), quick, new PrintStream(out, true, StandardCharsets.UTF_8));
  }
}
