package earward.desktop.model;

import static org.assertj.core.api.Assertions.assertThat;

import earward.block.figure.CaseName;
import earward.block.figure.Quantity;
import earward.desktop.TestWorkshop;
import earward.desktop.task.Runners;
import earward.kit.design.KitDesign;
import earward.kit.file.Designs;
import earward.kit.path.KitCurves;
import earward.kit.path.SolvedKit;
import earward.kit.review.ReviewedKit;
import java.util.Optional;
import java.util.concurrent.CountDownLatch;
import java.util.concurrent.TimeUnit;
import javax.swing.SwingUtilities;
import org.junit.jupiter.api.Test;

/** A solver that is slow with one design only: its result comes when nobody wants it any more. */
class SlowSolverTest {
  private static final class Slow implements Solving {
    private final KitSolving own;
    private final CountDownLatch goOn = new CountDownLatch(1);

    Slow(Workshop workshop) {
      own = new KitSolving(workshop);
    }

    private void wait(KitDesign design) {
      boolean slow =
          design.block("feed").map(b -> b.settings().toString().contains("8 kΩ")).orElse(false);
      try {
        if (slow && !goOn.await(20, TimeUnit.SECONDS)) {
          throw new IllegalStateException("nobody let the slow solve go on");
        }
      } catch (InterruptedException e) {
        Thread.currentThread().interrupt();
      }
    }

    @Override
    public SolvedKit headline(KitDesign design) {
      wait(design);
      return own.headline(design);
    }

    @Override
    public ReviewedKit review(KitDesign design) {
      wait(design);
      return own.review(design);
    }

    @Override
    public ReviewedKit remedies(ReviewedKit reviewed) {
      return reviewed;
    }

    @Override
    public Optional<KitCurves> curves(KitDesign design) {
      return Optional.empty();
    }
  }

  @Test
  void itsOldResultIsDroppedAndTheEventThreadIsNeverHeldUp() throws Exception {
    Workshop workshop = TestWorkshop.open();
    Slow slow = new Slow(workshop);
    try (Runners runners = new Runners()) {
      Workbench workbench =
          onEventThread(
              () ->
                  new Workbench(
                      workshop,
                      slow,
                      runners.lanes(),
                      Designs.read(TestWorkshop.kit("lantern")).design()));
      long began = System.nanoTime();
      onEventThread(
          () -> {
            workbench.edit("slow", d -> d.withSetting("feed", "parallel-ohms", "8 kΩ"));
            workbench.edit("quick", d -> d.withSetting("feed", "parallel-ohms", "10 kΩ"));
            return "";
          });
      assertThat(System.nanoTime() - began).isLessThan(TimeUnit.SECONDS.toNanos(2));
      slow.goOn.countDown();
      long end = System.currentTimeMillis() + 60_000;
      while (onEventThread(workbench::busy)) {
        assertThat(System.currentTimeMillis()).isLessThan(end);
        Thread.sleep(10);
      }
      double shown =
          onEventThread(
              () ->
                  workbench
                      .readings()
                      .find("detector.out", Quantity.DC_VOLTS, CaseName.TEST)
                      .value());
      double wanted =
          new KitSolving(workshop)
              .review(workbench.design())
              .figures()
              .find("detector.out", Quantity.DC_VOLTS, CaseName.TEST)
              .orElseThrow();
      assertThat(shown).isEqualTo(wanted);
    }
  }

  private static <T> T onEventThread(java.util.concurrent.Callable<T> work) throws Exception {
    var task = new java.util.concurrent.FutureTask<>(work);
    SwingUtilities.invokeAndWait(task);
    return task.get();
  }
}
