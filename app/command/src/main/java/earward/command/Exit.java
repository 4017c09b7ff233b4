package earward.command;

/** The exit codes of every command. */
final class Exit {
  static final int DONE = 0;

  /** Done, and a finding says: do not build this. */
  static final int DO_NOT_BUILD = 1;

  static final int INPUT_AT_FAULT = 2;
  static final int PROGRAM_AT_FAULT = 3;

  private Exit() {}
}
