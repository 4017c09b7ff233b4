package earward.desktop.model;

import java.util.concurrent.Callable;
import java.util.function.Consumer;

/** Does work elsewhere and brings its result back to where the model lives. */
public interface Background {
  /**
   * Starts work; one of the two is called later, in the order in which work was started or not at
   * all where later work came in between.
   */
  <T> void start(Callable<T> work, Consumer<T> done, Consumer<Exception> failed);
}
