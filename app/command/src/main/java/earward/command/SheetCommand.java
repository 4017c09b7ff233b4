package earward.command;

import earward.engine.CircuitException;
import earward.kit.path.Assembly;
import earward.kit.review.ReviewedKit;
import earward.kit.review.Reviewer;
import earward.kit.stage.BuildStages;
import earward.kit.stage.SolvedStage;
import earward.sheet.SheetWriter;
import earward.sheet.Sheets;
import earward.sheet.ShoppingCsv;
import earward.sheet.content.KeyFigure;
import earward.sheet.content.SheetContent;
import earward.sheet.wording.Numbers;
import earward.sheet.wording.Wording;
import earward.sheet.wording.WordingException;
import earward.study.batch.BatchProgress;
import earward.study.limits.KitLimits;
import earward.study.limits.LimitOrder;
import earward.study.limits.LimitStudy;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.List;
import java.util.Locale;
import java.util.Objects;
import java.util.Set;
import java.util.concurrent.CompletableFuture;
import java.util.stream.Collectors;
import org.jspecify.annotations.Nullable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;

/** The build sheet of a design, as PDF. */
@Command(
    name = "sheet",
    description = "Writes the build sheet of a kit design, and says its name and key figures.")
final class SheetCommand extends DesignCommand {
  private static final String ENDING = ".pdf";
  private static final int LIMIT_KITS = 1000;
  private static final int MOST_KITS = 100_000;

  @Option(
      names = {"-o", "--output"},
      paramLabel = "PDF",
      description = "File to write; else the design's name with .pdf, in the current folder.")
  private @Nullable Path output;

  @Option(
      names = "--kits",
      paramLabel = "N",
      defaultValue = "1",
      description = "How many kits the shopping list is for, from 1 to 100000; else one.")
  private int kits;

  @Option(
      names = "--shopping",
      paramLabel = "CSV",
      description = "Writes the shopping list to this file too, for a spreadsheet.")
  private @Nullable Path shopping;

  /** On their way since the kit was assembled. */
  private @Nullable CompletableFuture<List<SolvedStage>> stages;

  private @Nullable CompletableFuture<KitLimits> limits;

  @Override
  void begin() {
    var unused = CompletableFuture.runAsync(SheetWriter::prepare);
  }

  @Override
  void assembled(Assembly assembly) {
    stages = CompletableFuture.supplyAsync(() -> BuildStages.solve(assembly));
    limits = CompletableFuture.supplyAsync(() -> limits(assembly));
  }

  @Override
  void show(ReviewedKit reviewed, Program program) throws CommandFault {
    Path target = output == null ? besideTheUser() : output;
    OutputFile file = OutputFile.at(target, file());
    if (kits < 1 || kits > MOST_KITS) {
      throw CommandFault.ofInput(
          "--kits is " + kits + "; wanted a number of kits from 1 to " + MOST_KITS + ".");
    }
    SheetContent content;
    try {
      Wording wording = wording(reviewed, program.sheetWordings());
      content = content(reviewed, wording).forKits(kits);
      file.write(out -> SheetWriter.write(content, wording, out));
    } catch (WordingException e) {
      throw CommandFault.ofInput(String.valueOf(e.getMessage()));
    } catch (IOException | UncheckedIOException e) {
      throw OutputFile.fault(target, e);
    }
    results().println(target);
    if (shopping != null) {
      writeShopping(content, shopping);
    }
    keyFigures(content);
    if (reviewed.doNotBuild()) {
      results().println("DO NOT BUILD: a finding is STOP; 'earward review' says which.");
    }
  }

  /** Limits of the readings at rest: quick enough to wait for. */
  private static KitLimits limits(Assembly assembly) {
    try {
      return LimitStudy.of(assembly, LimitOrder.of(LIMIT_KITS, false), BatchProgress.NONE);
    } catch (CircuitException e) {
      return KitLimits.NONE; // the review says what is wrong with the circuit
    }
  }

  /** All of it in one language: findings were said in English so far. */
  private SheetContent content(ReviewedKit reviewed, Wording wording) {
    ReviewedKit said =
        wording.locale().getLanguage().equals(Reviewer.USUAL_LANGUAGE.getLanguage())
            ? reviewed
            : Reviewer.review(reviewed.solved(), wording.locale());
    return Sheets.of(
        said,
        Objects.requireNonNull(stages).join(),
        wording,
        Objects.requireNonNull(limits).join());
  }

  private void writeShopping(SheetContent content, Path csv) throws CommandFault {
    OutputFile file = OutputFile.at(csv, file());
    try {
      String text = ShoppingCsv.of(content.building());
      file.write(out -> out.write(text.getBytes(StandardCharsets.UTF_8)));
    } catch (IOException | UncheckedIOException e) {
      throw OutputFile.fault(csv, e);
    }
    results().println(csv);
  }

  /** The words of the design's language; it is not printed in another one unasked. */
  private Wording wording(ReviewedKit reviewed, Path folder) throws CommandFault, WordingException {
    String tag = reviewed.solved().assembly().design().sheet().language();
    Set<String> atHand = Wording.languages(folder);
    if (!atHand.contains(Locale.forLanguageTag(tag).getLanguage())) {
      throw CommandFault.ofInput(
          file()
              + ": the sheet's language is '"
              + tag
              + "', for which there is no wording; there are "
              + String.join(", ", atHand)
              + ": choose one of them, or put "
              + Locale.forLanguageTag(tag).getLanguage()
              + ".properties into "
              + folder
              + ".");
    }
    return Wording.of(folder, tag);
  }

  private void keyFigures(SheetContent content) {
    Numbers numbers = new Numbers(Locale.ROOT);
    TextTable table = new TextTable();
    for (KeyFigure figure : content.keyFigures()) {
      String amounts =
          figure.amounts().stream()
              .map(amount -> numbers.write(amount).whole())
              .collect(Collectors.joining(" to "));
      table.row(Shown.plain(figure.label()), Shown.plain(amounts), Shown.plain(figure.note()));
    }
    table.print(results());
  }

  private Path besideTheUser() {
    @Nullable Path name = file().getFileName();
    String text = name == null ? "kit" : name.toString();
    int point = text.lastIndexOf('.');
    return Path.of((point > 0 ? text.substring(0, point) : text) + ENDING);
  }
}
