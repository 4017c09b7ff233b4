package earward.desktop.model;

import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.Callable;
import java.util.function.Consumer;

/** Holds work until the test lets it run, in any order. */
final class Held implements Background {
  private final List<Runnable> waiting = new ArrayList<>();

  @Override
  public <T> void start(Callable<T> work, Consumer<T> done, Consumer<Exception> failed) {
    waiting.add(
        () -> {
          try {
            done.accept(work.call());
          } catch (Exception e) {
            failed.accept(e);
          }
        });
  }

  int count() {
    return waiting.size();
  }

  /** Runs what waits, and what that starts. */
  void runAll() {
    while (!waiting.isEmpty()) {
      waiting.remove(0).run();
    }
  }

  /** Runs the one that was started first. */
  void runFirst() {
    waiting.remove(0).run();
  }

  void runBackwards() {
    List<Runnable> now = List.copyOf(waiting);
    waiting.clear();
    for (int i = now.size() - 1; i >= 0; i--) {
      now.get(i).run();
    }
  }
}
