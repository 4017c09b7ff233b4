package earward.host;

import java.util.List;
import java.util.function.Supplier;
import org.jspecify.annotations.Nullable;

/**
 * The one way in which a plug-in is called: catches what it throws, refuses null, and blames the
 * plug-in by name.
 *
 * @param pluginId whom to blame
 * @param fileName of its jar
 */
record Guard(String pluginId, String fileName) {

  /**
   * What the call returns.
   *
   * @param call its name, for the sentence
   * @throws PluginFailure where the plug-in throws or returns null
   */
  @SuppressWarnings("CatchingUnchecked") // whatever a plug-in throws is a failure of that plug-in
  <T> T call(String call, Supplier<? extends @Nullable T> plugin) {
    T answer;
    try {
      answer = plugin.get();
    } catch (Throwable thrown) {
      letPass(thrown);
      throw new PluginFailure(Refusals.threw(this, call, thrown), thrown);
    }
    if (answer == null) {
      throw new PluginFailure(Refusals.gaveNothing(this, call), null);
    }
    return answer;
  }

  /** A list without nulls, copied so that the plug-in cannot change it later. */
  <T> List<T> list(String call, Supplier<? extends @Nullable List<T>> plugin) {
    return this.<List<T>>call(call, () -> copy(plugin.get()));
  }

  private static <T> @Nullable List<T> copy(@Nullable List<T> list) {
    return list == null ? null : List.copyOf(list);
  }

  /** Throws on what is no plug-in's fault: the machine out of memory, the thread told to end. */
  static void letPass(Throwable thrown) {
    if (thrown instanceof OutOfMemoryError outOfMemory) {
      throw outOfMemory;
    }
  }
}
