package earward.command;

import java.io.FilterOutputStream;
import java.io.IOException;
import java.io.OutputStream;
import java.util.Locale;
import java.util.Optional;
import org.jspecify.annotations.Nullable;

/** Standard output, watched: a writer swallows what fails in it, and this keeps the reason. */
final class ResultsOutput extends FilterOutputStream {
  private @Nullable IOException first;

  ResultsOutput(OutputStream out) {
    super(out);
  }

  @Override
  public void write(int octet) throws IOException {
    try {
      out.write(octet);
    } catch (IOException e) {
      throw kept(e);
    }
  }

  @Override
  public void write(byte[] octets, int from, int count) throws IOException {
    try {
      out.write(octets, from, count);
    } catch (IOException e) {
      throw kept(e);
    }
  }

  @Override
  public void flush() throws IOException {
    try {
      out.flush();
    } catch (IOException e) {
      throw kept(e);
    }
  }

  private IOException kept(IOException e) {
    first = first == null ? e : first;
    return e;
  }

  /** Why not all of the results were taken, in one sentence; empty where they were. */
  Optional<String> failure() {
    if (first == null) {
      return Optional.empty();
    }
    String reason = String.valueOf(first.getMessage());
    return Optional.of(
        reason.toLowerCase(Locale.ROOT).contains("pipe")
            ? "not all results were read: what reads standard output closed it before their end."
            : "the results cannot be written to standard output: " + reason + ".");
  }
}
