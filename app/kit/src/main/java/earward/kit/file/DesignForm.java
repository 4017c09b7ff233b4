package earward.kit.file;

import earward.kit.design.AddedTestPoint;
import earward.kit.design.Bench;
import earward.kit.design.KitConditions;
import earward.kit.design.KitDesign;
import earward.kit.design.References;
import earward.kit.design.SheetOptions;
import earward.kit.design.Tolerances;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/** A whole design, as a JSON object. */
final class DesignForm {
  static final String SCHEMA = "schema";
  static final String VERSION = "1";
  private static final String TEST_POINTS = "test points";
  private static final String TAKE_OFFS = "take-offs";

  private DesignForm() {}

  static KitDesign read(MembersReader in) throws DesignFileException {
    requireVersion(in);
    String title = in.requiredText("title");
    String revision = in.text("revision").orElse("A");
    Optional<MembersReader> conditionsIn = in.openOwn("conditions");
    KitConditions conditions =
        ConditionsForm.read(conditionsIn.orElseThrow(() -> in.missing("conditions")));
    Optional<MembersReader> tolerances = in.openOwn("tolerances");
    Optional<MembersReader> references = in.openOwn("references");
    Optional<MembersReader> sheet = in.openOwn("sheet");
    Optional<MembersReader> bench = in.openOwn("bench");
    GivenNames names = new GivenNames("block");
    var path = BlockForm.readAll(in, "path", names);
    var supplies = BlockForm.readAll(in, "supplies", names);
    var takeOffs = BlockForm.readAll(in, TAKE_OFFS, names);
    Tolerances shares =
        tolerances.isPresent() ? TolerancesForm.read(tolerances.get()) : Tolerances.USUAL;
    List<AddedTestPoint> points = testPoints(in);
    References given =
        references.isPresent() ? ReferencesForm.read(references.get()) : References.NONE;
    SheetOptions options =
        sheet.isPresent() ? SheetForm.readSheet(sheet.get()) : SheetOptions.USUAL;
    Bench owned = bench.isPresent() ? BenchForm.read(bench.get()) : Bench.USUAL;
    try {
      return new KitDesign(
          title,
          revision,
          conditions,
          path,
          supplies,
          takeOffs,
          shares,
          points,
          given,
          options,
          owned,
          in.written());
    } catch (IllegalArgumentException e) {
      throw in.impossible(e);
    }
  }

  static void requireVersion(MembersReader in) throws DesignFileException {
    Json.Scalar version = in.scalar(SCHEMA).orElseThrow(() -> in.missing(SCHEMA));
    if (version.quoted() || !version.words().equals(VERSION)) {
      throw DesignFileException.of(
          "schema-version",
          in.fileName(),
          version.at(),
          in.what()
              + " is of schema "
              + version.words()
              + "; this program reads schema "
              + VERSION
              + ": open it with the program that wrote it, or with a newer one");
    }
  }

  private static List<AddedTestPoint> testPoints(MembersReader in) throws DesignFileException {
    List<AddedTestPoint> points = new ArrayList<>();
    GivenNames names = new GivenNames("added test point");
    for (Json item : in.ownItems(TEST_POINTS)) {
      MembersReader point = MembersReader.of(item, in.source(), "an added test point");
      names.take(point);
      try {
        points.add(
            new AddedTestPoint(
                point.requiredText("id"),
                point.requiredText("node"),
                point.text("words").orElse(""),
                point.written()));
      } catch (IllegalArgumentException e) {
        throw point.impossible(e);
      }
    }
    return points;
  }

  static Json.Members write(KitDesign design) {
    return new MembersWriter(design.written())
        .bare(SCHEMA, VERSION)
        .text("title", design.title())
        .text("revision", design.revision(), "A")
        .nested("conditions", ConditionsForm.write(design.conditions()))
        .nested("path", BlockForm.writeAll(design.path()))
        .nested("supplies", BlockForm.writeAll(design.supplies()))
        .nested(TAKE_OFFS, BlockForm.writeAll(design.takeOffs()))
        .nested("tolerances", TolerancesForm.write(design.tolerances()))
        .nested(
            TEST_POINTS,
            Json.array(design.addedTestPoints().stream().map(DesignForm::testPoint).toList()))
        .nested("references", ReferencesForm.write(design.references()))
        .nested("sheet", SheetForm.writeSheet(design.sheet()))
        .nested("bench", bench(design))
        .done();
  }

  /** The usual bench is not written, unless the file had one. */
  private static Json bench(KitDesign design) {
    boolean usual = design.bench().equals(Bench.USUAL) && !design.written().has("bench");
    return usual ? Json.object(List.of()) : BenchForm.write(design.bench());
  }

  private static Json testPoint(AddedTestPoint point) {
    return new MembersWriter(point.written())
        .text("id", point.id())
        .text("node", point.node())
        .text("words", point.words(), "")
        .done();
  }
}
