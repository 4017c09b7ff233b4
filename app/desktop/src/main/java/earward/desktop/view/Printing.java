package earward.desktop.view;

import earward.desktop.model.SheetPages;
import earward.desktop.model.Words;
import earward.desktop.model.Workbench;
import earward.kit.review.ReviewedKit;
import java.awt.print.PrinterException;
import java.awt.print.PrinterJob;
import java.io.IOException;
import java.util.Optional;
import org.apache.pdfbox.Loader;
import org.apache.pdfbox.pdmodel.PDDocument;
import org.apache.pdfbox.printing.PDFPageable;

/** Prints the pages of the build sheet. */
final class Printing {
  private Printing() {}

  static void print(Workbench workbench) {
    Optional<ReviewedKit> kit = workbench.kit();
    if (kit.isEmpty()) {
      workbench.say(Words.of("nothing.solved"));
      return;
    }
    if (PrinterJob.lookupPrintServices().length == 0) {
      workbench.say(Words.of("print.none"));
      return;
    }
    PrinterJob job = PrinterJob.getPrinterJob();
    job.setJobName(workbench.design().title());
    if (!job.printDialog()) {
      return;
    }
    ReviewedKit mine = kit.get();
    workbench
        .lanes()
        .asked()
        .start(
            () -> {
              run(job, mine);
              return Words.of("print.done");
            },
            workbench::say,
            fault -> workbench.say(Words.of("print.failed", String.valueOf(fault.getMessage()))));
  }

  private static void run(PrinterJob job, ReviewedKit kit) throws IOException, PrinterException {
    try (PDDocument document = Loader.loadPDF(SheetPages.pdf(kit))) {
      job.setPageable(new PDFPageable(document));
      job.print();
    }
  }
}
