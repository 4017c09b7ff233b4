package earward.desktop.model;

/** How far a figure that is shown may be trusted to belong to the design that is shown. */
public enum Standing {
  /** Solved for this very design. */
  SETTLED("standing.settled"),
  /** Solved for what is being typed, or ahead of the whole solve. */
  PROVISIONAL("standing.provisional"),
  /** Of a former design: the present one is still being solved, or could not be. */
  FORMER("standing.former"),
  /** There is no such figure. */
  NONE("standing.none");

  private final String key;

  Standing(String key) {
    this.key = key;
  }

  /** What it is called. */
  public String word() {
    return Words.of(key);
  }
}
