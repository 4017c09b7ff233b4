package earward.desktop.view;

import earward.block.check.Severity;
import earward.desktop.model.Proposing;
import earward.desktop.model.Words;
import earward.desktop.model.Workbench;
import earward.kit.design.KitDesign;
import java.util.Optional;

/** Has values proposed, shows them as differences, and takes them as one edit if agreed to. */
final class Proposals {
  private final MainWindow window;
  private final Workbench workbench;
  private final Proposing proposing;

  Proposals(MainWindow window, Workbench workbench, Proposing proposing) {
    this.window = window;
    this.workbench = workbench;
    this.proposing = proposing;
  }

  void all() {
    KitDesign design = workbench.design();
    workbench.say(Words.of("propose.working"));
    workbench
        .lanes()
        .asked()
        .start(
            () -> proposing.propose(design, workbench.forms()),
            offer -> show(design, offer),
            fault -> workbench.say(Words.of("propose.failed", String.valueOf(fault.getMessage()))));
  }

  private void show(KitDesign of, Optional<Proposing.Offer> found) {
    if (!of.equals(workbench.design())) {
      workbench.say(Words.of("propose.outdated"));
      return;
    }
    if (found.isEmpty()) {
      workbench.say(Words.of("propose.none"));
      return;
    }
    Proposing.Offer offer = found.get();
    workbench.say(" ");
    String counts =
        Words.of(
            "propose.leaves",
            offer.count(Severity.STOP),
            offer.count(Severity.WEIGH),
            offer.count(Severity.NOTE));
    String says =
        offer.from().isEmpty() ? counts : Words.of("propose.from", offer.from()) + " " + counts;
    boolean agreed =
        TableDialog.show(
            window.getContentPane(),
            Words.of("propose.title"),
            says,
            offer.differences(),
            Words.of("difference.now"),
            Words.of("difference.proposed"),
            Words.of("propose.take"));
    if (agreed) {
      workbench.edit(Words.of("edit.proposal"), design -> offer.edited());
    }
  }
}
