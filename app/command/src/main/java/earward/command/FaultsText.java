package earward.command;

import earward.kit.path.Assembly;
import earward.kit.review.ReviewedKit;
import earward.study.faults.FaultGroup;
import earward.study.faults.FaultGuide;
import earward.study.faults.FaultReading;
import earward.study.faults.FaultSigns;
import earward.study.faults.Signs;
import java.io.PrintWriter;
import java.util.ArrayList;
import java.util.List;
import java.util.stream.Collectors;

/** A fault guide for people: what is seen, and which faults it may be. */
final class FaultsText {
  private static final String INDENT = "      ";

  private FaultsText() {}

  static void print(PrintWriter to, ReviewedKit reviewed, FaultGuide guide) {
    Assembly assembly = reviewed.solved().assembly();
    to.println(KitHead.line(reviewed));
    to.println();
    to.println(
        guide.faults()
            + " single faults in "
            + guide.groups().size()
            + " groups that can be told apart, the probable ones first; "
            + guide.withoutTrace().size()
            + " leave no trace.");
    to.println(
        "Readings: no-signal; test (test signal); injection (a cell of 1.5 V through 1 kΩ at the"
            + " diode, feed lifted); ohms (supply off, ICs out of their sockets, red on plus)."
            + " The tone is that of the test signal.");
    for (FaultGroup group : guide.groups()) {
      to.println();
      to.println(
          String.format(
              java.util.Locale.ROOT,
              "%3d  %.1f %%  %s",
              group.number(),
              100 * group.prior(),
              seen(guide, group)));
      for (FaultSigns each : group.faults()) {
        to.println(INDENT + FaultWords.sentence(assembly, each.fault()));
      }
    }
    if (!guide.withoutTrace().isEmpty()) {
      to.println();
      to.println("Without a trace in these readings:");
      to.println(
          INDENT
              + guide.withoutTrace().stream()
                  .map(each -> FaultWords.sentence(assembly, each.fault()))
                  .collect(Collectors.joining("; ")));
    }
  }

  /** What differs from a healthy kit: observations, then readings with the healthy ones. */
  private static String seen(FaultGuide guide, FaultGroup group) {
    List<String> seen = new ArrayList<>();
    Signs signs = group.signs();
    if (group.tells().contains(FaultReading.TONE)) {
      seen.add("tone " + signs.tone().key());
    }
    if (group.tells().contains(FaultReading.HEAT)) {
      seen.add("hot at rest");
    }
    for (int i = 0; i < guide.readings().size(); i++) {
      FaultReading reading = guide.readings().get(i);
      if (group.tells().contains(reading.key())) {
        seen.add(
            reading.key()
                + " "
                + FaultWords.value(reading, signs.readings().get(i))
                + " (not "
                + FaultWords.value(reading, guide.healthy().readings().get(i))
                + ")");
      }
    }
    return String.join("; ", seen);
  }
}
