package earward.engine;

import earward.block.check.Finding;

/** A circuit that cannot be compiled, with the finding that says why. */
public final class CircuitException extends RuntimeException {
  private static final long serialVersionUID = 1L;

  private final transient Finding finding;

  CircuitException(Finding finding) {
    super(finding.sentence());
    this.finding = finding;
  }

  /** What is wrong, and where. */
  public Finding finding() {
    return finding;
  }
}
