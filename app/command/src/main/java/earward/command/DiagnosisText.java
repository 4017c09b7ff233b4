package earward.command;

import earward.kit.path.Assembly;
import earward.kit.review.ReviewedKit;
import earward.study.diagnosis.Diagnosis;
import earward.study.diagnosis.Evidence;
import earward.study.diagnosis.RankedGroup;
import earward.study.faults.FaultGuide;
import java.io.PrintWriter;
import java.util.Locale;

/** A diagnosis for people: the probable groups, how they fit, what to read next. */
final class DiagnosisText {
  static final int SHOWN = 5;
  private static final double LEAST_SHOWN = 0.005;
  private static final String INDENT = "      ";

  private DiagnosisText() {}

  static void print(
      PrintWriter to,
      ReviewedKit reviewed,
      Evidence evidence,
      Diagnosis diagnosis,
      FaultGuide guide) {
    Assembly assembly = reviewed.solved().assembly();
    to.println(KitHead.line(reviewed));
    to.println();
    int shown = 0;
    for (RankedGroup ranked : diagnosis.ranked()) {
      if (shown < SHOWN && (shown == 0 || ranked.probability() >= LEAST_SHOWN)) {
        shown++;
        to.println(
            String.format(
                Locale.ROOT,
                "%d.  %.1f %%  %s; %d of %d readings fit%s",
                shown,
                100 * ranked.probability(),
                ranked.group().map(g -> "group " + g.number()).orElse("no fault that shows"),
                ranked.fits(),
                evidence.size(),
                ranked.misfits().isEmpty() ? "" : ", not " + String.join(", ", ranked.misfits())));
        ranked
            .group()
            .ifPresent(
                group ->
                    group
                        .faults()
                        .forEach(
                            each ->
                                to.println(INDENT + FaultWords.sentence(assembly, each.fault()))));
      }
    }
    to.println();
    to.println(
        diagnosis
            .next()
            .map(key -> "Most worth reading next: " + key + ".")
            .orElse("No other reading would tell more."));
    to.println(
        guide.withoutTrace().size()
            + " faults leave no trace in any reading; 'earward faults' lists them.");
  }
}
