package earward.command;

import earward.engine.CircuitException;
import earward.kit.design.KitDesign;
import earward.kit.file.Designs;
import earward.kit.path.Assembly;
import earward.kit.review.ReviewedKit;
import earward.study.batch.BatchProgress;
import earward.study.diagnosis.Diagnosis;
import earward.study.diagnosis.Diagnostician;
import earward.study.diagnosis.Evidence;
import earward.study.diagnosis.ReadingsException;
import earward.study.diagnosis.ReadingsText;
import earward.study.faults.FaultGuide;
import earward.study.faults.FaultOrder;
import earward.study.faults.FaultSolver;
import earward.study.faults.FaultStudy;
import earward.study.faults.ReadingError;
import java.io.IOException;
import java.nio.charset.CharacterCodingException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Objects;
import org.jspecify.annotations.Nullable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;

/** From a builder's readings to the faults that explain them. */
@Command(
    name = "diagnose",
    description = {
      "Ranks the groups of faults that explain a builder's readings, and names the reading most",
      "worth taking next. READINGS is CSV, one reading a line: TP7:no-signal,4.7 V or tone,silent;",
      "'earward faults' shows what a kit's readings are called."
    })
final class DiagnoseCommand extends DesignCommand {
  /** Far more than any sheet of readings has. */
  private static final long MOST_BYTES = 1_000_000;

  @Parameters(index = "1", paramLabel = "READINGS", description = "Readings taken (.csv).")
  private @Nullable Path readings;

  @Option(names = "--json", description = "As JSON, in SI base units (diagnose.schema.json).")
  private boolean json;

  @Override
  void show(ReviewedKit reviewed, Program program) throws CommandFault {
    String text = text(Objects.requireNonNull(readings));
    Assembly assembly = reviewed.solved().assembly();
    FaultOrder order = FaultOrder.usual();
    FaultSolver solver;
    try {
      solver = new FaultSolver(assembly, order.habits());
    } catch (CircuitException e) {
      throw CommandFault.ofInput(file() + ": " + e.finding().sentence());
    }
    Evidence evidence = evidence(text, solver, assembly.design());
    FaultGuide guide = FaultStudy.of(solver, order, BatchProgress.NONE);
    Diagnosis diagnosis = new Diagnostician(guide, ReadingError.of(guide, assembly)).of(evidence);
    if (json) {
      JsonOut.print(results(), DiagnosisJson.of(reviewed, evidence, diagnosis, guide));
    } else {
      DiagnosisText.print(results(), reviewed, evidence, diagnosis, guide);
    }
  }

  private Evidence evidence(String text, FaultSolver solver, KitDesign design) throws CommandFault {
    String digest = Designs.digest(design).hex();
    try {
      return new ReadingsText(String.valueOf(readings), solver.readings(), design, digest)
          .read(text);
    } catch (ReadingsException e) {
      throw CommandFault.ofInput(e.sentence());
    }
  }

  private static String text(Path file) throws CommandFault {
    try {
      if (!Files.exists(file)) {
        throw CommandFault.ofInput(file + " does not exist; name a file of readings.");
      }
      if (Files.isDirectory(file)) {
        throw CommandFault.ofInput(file + " is a folder; name a file of readings.");
      }
      if (Files.size(file) > MOST_BYTES) {
        throw CommandFault.ofInput(
            file + " is larger than " + MOST_BYTES + " bytes; that is no sheet of readings.");
      }
      return Files.readString(file);
    } catch (CharacterCodingException e) {
      throw CommandFault.ofInput(file + " is no text in UTF-8; save it as CSV in UTF-8.");
    } catch (IOException e) {
      throw CommandFault.ofInput(file + " cannot be read: " + e.getMessage() + ".");
    }
  }
}
