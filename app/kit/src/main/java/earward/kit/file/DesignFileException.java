package earward.kit.file;

import earward.block.check.Finding;
import earward.block.check.Severity;

/** A file that cannot be read or written: one finding, with its place. */
public final class DesignFileException extends Exception {
  private static final long serialVersionUID = 1L;
  private final transient Finding finding;
  private final String fileName;
  private final int line;
  private final int column;

  private DesignFileException(Finding finding, String fileName, int line, int column) {
    super(finding.sentence());
    this.finding = finding;
    this.fileName = fileName;
    this.line = line;
    this.column = column;
  }

  /** With the sentence {@code FILE, line L, column C: WHAT}. */
  static DesignFileException of(String code, String fileName, Json.Place at, String what) {
    String place = at.line() > 0 ? ", line " + at.line() + ", column " + at.column() : "";
    String sentence = fileName + place + ": " + what;
    return new DesignFileException(
        Finding.of(Severity.STOP, code, fileName + place, sentence),
        fileName,
        at.line(),
        at.column());
  }

  /** What was found. */
  public Finding finding() {
    return finding;
  }

  /** The finding's sentence: file, place, what was found, what is wanted. */
  public String sentence() {
    return String.valueOf(getMessage());
  }

  /** The file's name as it was given. */
  public String fileName() {
    return fileName;
  }

  /** Line, from 1; 0 where the fault has no place in the text. */
  public int line() {
    return line;
  }

  /** Column, from 1; 0 where the fault has no place in the text. */
  public int column() {
    return column;
  }
}
