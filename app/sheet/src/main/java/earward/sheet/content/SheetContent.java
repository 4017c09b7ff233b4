package earward.sheet.content;

import earward.block.check.Severity;
import earward.kit.design.SheetOptions.Paper;
import java.util.List;
import java.util.Objects;

/**
 * All that one build sheet says. The sheet prints what stands here and solves nothing.
 *
 * @param title which kit
 * @param paper its size
 * @param language tag of the wording, for instance {@code en}
 * @param introduction what the kit is, one paragraph
 * @param conditions under which all figures hold
 * @param keyFigures what the kit does
 * @param cautions gravest first
 * @param drawing of the path
 * @param pinOuts of the integrated circuits
 * @param parts in fitting order
 * @param building how it is bought and built
 * @param method how the expected values are to be measured, one paragraph each
 * @param testPoints in the order of the path
 * @param currents of the supplies
 * @param heat of the parts that get warm
 * @param seams in the order of the path
 * @param findings gravest first
 */
public record SheetContent(
    KitTitle title,
    Paper paper,
    String language,
    String introduction,
    List<KeyFigure> conditions,
    List<KeyFigure> keyFigures,
    List<CautionRow> cautions,
    PathDrawing drawing,
    List<PinOut> pinOuts,
    List<PartRow> parts,
    Building building,
    List<String> method,
    List<TestPointRow> testPoints,
    List<CurrentRow> currents,
    List<HeatRow> heat,
    List<SeamRow> seams,
    List<FindingRow> findings) {
  public SheetContent {
    Objects.requireNonNull(title);
    Objects.requireNonNull(paper);
    Objects.requireNonNull(language);
    Objects.requireNonNull(introduction);
    Objects.requireNonNull(drawing);
    Objects.requireNonNull(building);
    conditions = List.copyOf(conditions);
    keyFigures = List.copyOf(keyFigures);
    cautions = List.copyOf(cautions);
    pinOuts = List.copyOf(pinOuts);
    parts = List.copyOf(parts);
    method = List.copyOf(method);
    testPoints = List.copyOf(testPoints);
    currents = List.copyOf(currents);
    heat = List.copyOf(heat);
    seams = List.copyOf(seams);
    findings = List.copyOf(findings);
  }

  /** Whether the design must not be built: every page then says so. */
  public boolean stopped() {
    return findings.stream().anyMatch(finding -> finding.severity() == Severity.STOP);
  }

  /** The same sheet on another paper; its drawing keeps the width that it was laid for. */
  public SheetContent withPaper(Paper changed) {
    return new SheetContent(
        title,
        changed,
        language,
        introduction,
        conditions,
        keyFigures,
        cautions,
        drawing,
        pinOuts,
        parts,
        building,
        method,
        testPoints,
        currents,
        heat,
        seams,
        findings);
  }

  /** The same sheet with parts bought for so many kits. */
  public SheetContent forKits(int kits) {
    return new SheetContent(
        title,
        paper,
        language,
        introduction,
        conditions,
        keyFigures,
        cautions,
        drawing,
        pinOuts,
        parts,
        building.forKits(kits),
        method,
        testPoints,
        currents,
        heat,
        seams,
        findings);
  }
}
