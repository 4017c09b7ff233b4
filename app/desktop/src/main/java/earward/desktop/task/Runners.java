package earward.desktop.task;

import earward.desktop.model.Lanes;
import java.util.ArrayList;
import java.util.List;

/** The worker threads of one window: one for each lane. */
public final class Runners implements AutoCloseable {
  private final List<Runner> all = new ArrayList<>();
  private final Lanes lanes =
      new Lanes(
          lane("quick", true),
          lane("thorough", true),
          lane("late", true),
          lane("live", true),
          lane("pages", false),
          lane("asked", false));

  private Runner lane(String name, boolean latestOnly) {
    Runner runner = new Runner(name, latestOnly);
    all.add(runner);
    return runner;
  }

  /** The lanes. */
  public Lanes lanes() {
    return lanes;
  }

  @Override
  public void close() {
    all.forEach(Runner::close);
  }
}
