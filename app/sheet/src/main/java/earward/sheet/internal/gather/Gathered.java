package earward.sheet.internal.gather;

import earward.block.check.Finding;
import earward.block.device.Device;
import earward.block.quantity.Unit;
import earward.kit.design.Digest;
import earward.kit.design.KitDesign;
import earward.kit.design.SheetOptions;
import earward.kit.design.Tolerances;
import earward.kit.path.Assembly;
import earward.kit.path.Figures;
import earward.kit.path.PlacedTestPoint;
import earward.kit.review.Remedy;
import earward.kit.review.ReviewFinding;
import earward.kit.review.ReviewedKit;
import earward.kit.stage.SolvedStage;
import earward.sheet.content.Building;
import earward.sheet.content.FindingRow;
import earward.sheet.content.KitTitle;
import earward.sheet.content.SheetContent;
import earward.sheet.internal.section.Words;
import earward.study.limits.KitLimits;
import earward.study.limits.PointLimits;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/** All that a reviewed kit says, as the content of its sheet. */
public final class Gathered {
  private Gathered() {}

  /** The content. */
  public static SheetContent of(
      ReviewedKit kit, List<SolvedStage> stages, Digest digest, Words words, KitLimits limits) {
    Assembly assembly = kit.solved().assembly();
    Figures figures = kit.figures();
    KitDesign design = assembly.design();
    SheetOptions options = design.sheet();
    BlockNames names = new BlockNames(assembly, words.wording().locale());
    PartRows parts = new PartRows(assembly, names, words);
    FigureRows rows = new FigureRows(assembly, figures, names, words, limits);
    CoverFigures cover = new CoverFigures(assembly, figures, names, words);
    CautionRows cautions = new CautionRows(assembly, figures, words);
    Drawn drawn = new Drawn(assembly, names, parts, words);
    String name = design.title().isBlank() ? words.text("title.nameless") : design.title();
    return new SheetContent(
        new KitTitle(
            name, design.revision(), digest.shortForm(), options.clubName(), options.kitNumber()),
        options.paper(),
        options.language(),
        cover.introduction(),
        cover.conditions(),
        cover.keyFigures(),
        cautions.rows(),
        drawn.drawing(),
        parts.pinOuts(),
        parts.rows(),
        new Building(
            new StageRows(assembly, names, parts, cautions, drawn, words).rows(stages),
            new WireRows(assembly, words).rows(),
            parts.shopping(),
            1),
        method(cover, assembly, limits, words),
        rows.testPoints(),
        rows.currents(),
        rows.heat(),
        rows.seams(),
        findings(kit.findings()));
  }

  /** How to measure; and where there are limits, where they come from. */
  private static List<String> method(
      CoverFigures cover, Assembly assembly, KitLimits limits, Words words) {
    List<String> method = new ArrayList<>(cover.method());
    if (limits.kits() > 0) {
      method.add(
          words.text(
              limits.supplyPlace().isPresent() ? "method.limits-supply" : "method.limits",
              "kits",
              Integer.toString(limits.kits()),
              "instrument",
              limits.points().stream()
                  .map(PointLimits::instrument)
                  .filter(name -> !name.isEmpty())
                  .findFirst()
                  .orElse(""),
              "supply",
              words.numbers().text(limits.supplyVolts(), Unit.VOLT),
              "point",
              assembly.testPoints().stream()
                  .filter(point -> limits.supplyPlace().equals(Optional.of(point.place())))
                  .map(PlacedTestPoint::reference)
                  .findFirst()
                  .orElse("")));
    }
    return method;
  }

  /** What is written beside a part on its drawing. */
  public static String partValue(Device device, Words words) {
    return new PartWords(words, Tolerances.USUAL).value(device);
  }

  private static List<FindingRow> findings(List<ReviewFinding> findings) {
    return findings.stream()
        .map(
            reviewed -> {
              Finding finding = reviewed.finding();
              List<String> remedies = reviewed.remedies().stream().map(Remedy::sentence).toList();
              return new FindingRow(
                  finding.severity(), finding.sentence(), finding.source(), remedies);
            })
        .toList();
  }
}
