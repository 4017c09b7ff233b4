package earward.timing;

/** A time that must be kept. */
interface Bar {
  /** A run of quick bars takes a fifth of the length. */
  int QUICK_SHARE = 5;

  /** A quick bar may take twice as long: its machine is busy with other things. */
  double QUICK_SLACK = 2;

  /** What is timed. */
  String name();

  /**
   * Times it.
   *
   * @param quick a fifth of the length against four times the time
   * @throws Exception whatever stopped it; the bar counts as missed
   */
  Timed measure(boolean quick) throws Exception;
}
