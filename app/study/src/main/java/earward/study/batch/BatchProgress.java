package earward.study.batch;

/** Is told how a batch goes on, by the thread that asked for it, and may end it. */
@FunctionalInterface
public interface BatchProgress {
  /** Nobody listens. */
  BatchProgress NONE = (done, kits) -> true;

  /**
   * So many kits are done.
   *
   * @return whether to go on; false ends the batch with what is done
   */
  boolean goesOn(long done, long kits);
}
