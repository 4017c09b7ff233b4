package earward.timing;

import earward.kit.path.Assembly;
import earward.kit.path.SolvedKit;
import java.io.IOException;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.Param;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.Setup;
import org.openjdk.jmh.annotations.State;
import org.openjdk.jmh.annotations.TearDown;

/** What happens between an edit of a design and its figures. */
@State(Scope.Thread)
@SuppressWarnings("NullAway.Init") // JMH calls the method marked Setup first
public class AfterAnEdit {
  /** The starter kit; Hayloft has the most parts. */
  @Param("hayloft")
  public String name = "hayloft";

  private StarterKit kit;

  /** Reads the kit and proves that it can be solved. */
  @Setup
  public void open() {
    kit = StarterKit.open(name);
  }

  /** Closes its plug-ins. */
  @TearDown
  public void close() throws IOException {
    kit.close();
  }

  /** Blocks described and joined. */
  @Benchmark
  public Assembly assembled() {
    return kit.assembled();
  }

  /** Blocks described and joined, the circuit compiled and solved in all its cases. */
  @Benchmark
  public SolvedKit allFigures() {
    return kit.solved();
  }
}
