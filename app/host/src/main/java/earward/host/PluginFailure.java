package earward.host;

import earward.block.check.Finding;
import org.jspecify.annotations.Nullable;

/**
 * A plug-in threw or gave back what it must not. The message names the plug-in, so whoever turns a
 * refusal of settings into a finding does right by this too.
 */
public final class PluginFailure extends IllegalArgumentException {
  private static final long serialVersionUID = 1L;

  private final transient Finding finding;

  PluginFailure(Finding finding, @Nullable Throwable cause) {
    super(finding.sentence(), cause);
    this.finding = finding;
  }

  /** The same as data; the subject is the name of the plug-in's file. */
  public Finding finding() {
    return finding;
  }
}
