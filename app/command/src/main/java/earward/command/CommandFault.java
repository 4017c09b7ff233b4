package earward.command;

import java.util.List;

/** What ends a command early: one sentence for each thing that is at fault, and the exit code. */
final class CommandFault extends Exception {
  private static final long serialVersionUID = 1L;
  private final int exitCode;
  private final transient List<String> sentences;

  private CommandFault(int exitCode, List<String> sentences) {
    super(String.join(" ", sentences));
    this.exitCode = exitCode;
    this.sentences = List.copyOf(sentences);
  }

  static CommandFault ofInput(String sentence) {
    return ofInput(List.of(sentence));
  }

  static CommandFault ofInput(List<String> sentences) {
    return new CommandFault(Exit.INPUT_AT_FAULT, sentences);
  }

  static CommandFault ofProgram(String sentence) {
    return new CommandFault(Exit.PROGRAM_AT_FAULT, List.of(sentence));
  }

  int exitCode() {
    return exitCode;
  }

  List<String> sentences() {
    return sentences;
  }
}
