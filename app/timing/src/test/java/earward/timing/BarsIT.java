package earward.timing;

import static org.assertj.core.api.Assertions.assertThat;

import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.condition.EnabledIfEnvironmentVariable;

/**
 * All bars against the runnable folder, at a fifth of their length with twice their time. In CI
 * alone: times by the wall clock say nothing on a desk where other things run.
 */
@EnabledIfEnvironmentVariable(named = "CI", matches = "true")
class BarsIT {
  @Test
  void everyBarIsKept() throws Exception {
    Process process =
        new ProcessBuilder(
                Path.of(System.getProperty("java.home"), "bin", "java").toString(),
                "-Dearward.home=" + System.getProperty("earward.folder"),
                "-jar",
                System.getProperty("earward.timing"),
                "bars",
                "--quick")
            .redirectErrorStream(true)
            .start();
    String said = new String(process.getInputStream().readAllBytes(), StandardCharsets.UTF_8);
    System.out.print(said);
    assertThat(process.waitFor()).as(said).isZero();
    assertThat(said).contains("kept ").doesNotContain("MISSED", "FAILED");
  }
}
