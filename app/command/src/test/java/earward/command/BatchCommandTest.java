package earward.command;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import earward.engine.Solver;
import earward.kit.path.Assembly;
import earward.study.batch.Batch;
import earward.study.batch.BatchOrder;
import earward.study.batch.BatchPlan;
import earward.study.batch.BatchProgress;
import earward.study.batch.BatchResult;
import earward.study.batch.Habits;
import java.io.IOException;
import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;

/** Many kits of a starter kit, as a user asks for them. */
class BatchCommandTest {
  private static final long SEED = 11;

  private static Assembly lantern() {
    return TestKits.assembled(TestKits.starter("lantern"));
  }

  @Test
  void aBatchIsToldInJson() throws IOException {
    Ran ran = Ran.earward("batch", "--kits", "40", "--json", TestHome.starterKit("hayloft"));

    assertThat(ran.code()).as(ran.messages()).isZero();
    SchemaCheck.assertValid("batch", ran.results());
    JsonNode root = new ObjectMapper().readTree(ran.results());
    assertThat(root.get("kits").asInt()).isEqualTo(40);
    assertThat(root.get("yield").get("unsolved").asInt()).isZero();
    assertThat(root.get("readings").findValuesAsText("figure"))
        .contains(
            "detector.out:dc-volts@test",
            "battery.rail:dc-volts@no-signal",
            "path:distortion@test",
            "power.amplifier:junction-celsius@hottest");
    for (JsonNode reading : root.get("readings")) {
      assertThat(reading.get("median").asDouble())
          .isBetween(reading.get("least").asDouble(), reading.get("most").asDouble());
    }
  }

  @Test
  void whatMattersIsToldOnRequest() throws IOException {
    Ran ran =
        Ran.earward("batch", "--kits", "80", "--matters", "--json", TestHome.starterKit("hayloft"));

    assertThat(ran.code()).as(ran.messages()).isZero();
    SchemaCheck.assertValid("batch", ran.results());
    JsonNode matters = new ObjectMapper().readTree(ran.results()).get("matters");
    for (JsonNode figure : matters.get("figures")) {
      if (figure.get("figure").asText().equals("path:supply-amperes@no-signal")) {
        JsonNode first = figure.get("shares").get(0);
        assertThat(first.get("parameter").asText()).isEqualTo("quiescent-amperes");
        assertThat(first.get("share").asDouble()).isGreaterThan(0.8);
      }
    }
    assertThat(matters.get("tolerances").size()).isEqualTo(4);
  }

  @Test
  void aBatchIsReadByPeople() {
    Ran ran = Ran.earward("batch", "--kits", "20", "--seed", "3", TestHome.starterKit("boathouse"));

    assertThat(ran.code()).as(ran.messages()).isZero();
    assertThat(ran.results())
        .startsWith("Boathouse, revision A, digest ")
        .contains("20 kits, seed 3: yield ", "99.5 %", "Worst kit: number ", "Taken for granted");
  }

  @Test
  void theThreadsChangeNothing() {
    BatchPlan plan = BatchPlan.of(lantern(), false, Habits.USUAL);
    BatchResult one = run(plan, 1);
    BatchResult three = run(plan, 3);

    assertThat(three.readings()).isEqualTo(one.readings());
    assertThat(three.checks()).isEqualTo(one.checks());
    assertThat(three.worst()).isEqualTo(one.worst());
    assertThat(three.passed()).isEqualTo(one.passed());
  }

  private static BatchResult run(BatchPlan plan, int threads) {
    BatchOrder order = new BatchOrder(140, SEED, threads, false, Habits.USUAL);
    return Batch.run(plan, order, BatchProgress.NONE);
  }

  @Test
  void aKitOfABatchIsItsSingleSolve() {
    BatchPlan plan = BatchPlan.of(lantern(), false, Habits.USUAL);
    List<double[]> kits = new ArrayList<>();
    BatchOrder order = new BatchOrder(200, SEED, 2, false, Habits.USUAL);
    Batch.each(plan, order, BatchProgress.NONE, (number, figures) -> kits.add(figures));
    assertThat(kits).hasSize(200);
    double[] values = plan.draw().nominal();
    double[] row = new double[plan.kit().circuit().figures().size()];
    for (int kit : new int[] {0, 77, 199}) {
      Solver alone = plan.kit().circuit().newSolver();
      plan.draw().draw(SEED, kit, values);
      assertThat(alone.solve(values, row).solved()).isTrue();
      for (int i = 0; i < plan.readings().size(); i++) {
        double single = plan.kit().figures(row).orNaN(plan.readings().get(i));
        double inBatch = kits.get(kit)[i];
        if (!Double.isNaN(single) || !Double.isNaN(inBatch)) {
          assertThat(inBatch)
              .as(plan.readings().get(i).toString())
              .isCloseTo(single, within(1e-9 * Math.max(1e-6, Math.abs(single))));
        }
      }
    }
  }

  @Test
  void aBatchCanBeEnded() {
    BatchPlan plan = BatchPlan.of(lantern(), false, Habits.USUAL);
    BatchOrder order = new BatchOrder(100_000, SEED, 2, false, Habits.USUAL);
    BatchResult result = Batch.run(plan, order, (done, kits) -> done < 40);

    assertThat(result.cancelled()).isTrue();
    assertThat(result.kits()).isBetween(40L, 60L);
  }

  @Test
  void impossibleNumbersAreRefusedInOneSentence() {
    Ran kits = Ran.earward("batch", "--kits", "0", TestHome.starterKit("lantern"));
    assertThat(kits.code()).isEqualTo(2);
    assertThat(kits.messages()).contains("--kits is 0; it must be from 1 to");
    Ran threads = Ran.earward("batch", "--threads", "-2", TestHome.starterKit("lantern"));
    assertThat(threads.code()).isEqualTo(2);
    assertThat(threads.messages()).contains("--threads is -2");
    Ran words = Ran.earward("batch", "--kits", "many", TestHome.starterKit("lantern"));
    assertThat(words.code()).isEqualTo(2);
    assertThat(words.messages()).contains("many");
  }
}
