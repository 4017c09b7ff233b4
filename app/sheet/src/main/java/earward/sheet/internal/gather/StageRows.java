package earward.sheet.internal.gather;

import earward.block.Role;
import earward.block.device.Adaptor;
import earward.block.device.Battery;
import earward.block.device.Device;
import earward.block.device.Loudspeaker;
import earward.block.figure.CaseName;
import earward.block.figure.Quantity;
import earward.block.quantity.Unit;
import earward.kit.design.Bench;
import earward.kit.path.Assembly;
import earward.kit.path.PlacedBlock;
import earward.kit.path.PlacedTestPoint;
import earward.kit.stage.SolvedStage;
import earward.sheet.content.Amount;
import earward.sheet.content.StageRow;
import earward.sheet.internal.section.Words;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.stream.Collectors;
import java.util.stream.IntStream;

/** The build stages, in the builder's words. */
final class StageRows {
  /** Below this two readings are the same to a builder's meter. */
  private static final double SAME_VOLTS = 0.02;

  /** Power ratings of resistors on sale, in watts (common practice). */
  private static final List<Double> RATED_WATTS = List.of(0.25, 0.5, 1.0, 2.0, 3.0, 5.0, 10.0);

  private final Assembly assembly;
  private final BlockNames names;
  private final PartRows parts;
  private final CautionRows cautions;
  private final Drawn drawn;
  private final Words words;

  StageRows(
      Assembly assembly,
      BlockNames names,
      PartRows parts,
      CautionRows cautions,
      Drawn drawn,
      Words words) {
    this.assembly = assembly;
    this.names = names;
    this.parts = parts;
    this.cautions = cautions;
    this.drawn = drawn;
    this.words = words;
  }

  List<StageRow> rows(List<SolvedStage> stages) {
    return IntStream.range(0, stages.size())
        .parallel()
        .mapToObj(i -> row(stages.get(i), i == 0 ? Map.of() : rest(stages.get(i - 1))))
        .toList();
  }

  private static Map<String, Double> rest(SolvedStage stage) {
    Map<String, Double> rest = new HashMap<>();
    for (PlacedTestPoint point : stage.partial().testPoints()) {
      stage
          .figures()
          .find(point.place(), Quantity.DC_VOLTS, SolvedStage.AT_REST)
          .ifPresent(volts -> rest.put(point.place(), volts));
    }
    return rest;
  }

  private StageRow row(SolvedStage solved, Map<String, Double> before) {
    List<PlacedBlock> blocks = solved.stage().blocks();
    List<StageRow.Part> fitted = parts.lowestFirst(blocks);
    Set<String> references =
        fitted.stream()
            .map(StageRow.Part::reference)
            .collect(Collectors.toCollection(LinkedHashSet::new));
    String title = blocks.stream().map(names::of).collect(Collectors.joining(", "));
    List<StageRow.Point> points = points(solved, before);
    return new StageRow(
        solved.stage().number(),
        title,
        fitted,
        cautions.of(references),
        drawn.stage(solved.stage().path(), solved.stage().beside(), solved.stage().number() == 1),
        connect(solved),
        unpowered(solved),
        power(solved),
        method(solved, points),
        points,
        listen(solved));
  }

  private List<String> connect(SolvedStage solved) {
    List<String> steps = new ArrayList<>();
    if (solved.stage().number() > 1) {
      steps.add(words.text("stage.free", "ohms", ohms(SolvedStage.JOINT_OHMS)));
    }
    for (String node : solved.joints()) {
      String where = where(solved, node);
      steps.add(words.text("stage.join", "ohms", ohms(SolvedStage.JOINT_OHMS), "point", where));
    }
    if (solved.joints().isEmpty()) {
      steps.add(words.text("stage.whole"));
    }
    return steps;
  }

  /** The flag of a test point there, and the parts that meet there. */
  private String where(SolvedStage solved, String node) {
    String leads = new Joints(solved.partial(), words).from("", node);
    String flag =
        solved.partial().testPoints().stream()
            .filter(point -> point.node().equals(node))
            .map(PlacedTestPoint::reference)
            .findFirst()
            .orElse("");
    if (flag.isEmpty() || leads.isEmpty()) {
      return flag + leads;
    }
    return words.text("stage.point", "flag", flag, "parts", leads);
  }

  private String ohms(double ohms) {
    return words.numbers().text(ohms, Unit.OHM);
  }

  private List<String> unpowered(SolvedStage solved) {
    List<String> steps = new ArrayList<>();
    boolean first = solved.stage().number() == 1;
    steps.add(words.text(first ? "stage.look" : "stage.look-again"));
    for (PlacedBlock block : solved.stage().blocks()) {
      for (var part : block.description().wiring().partsOf(Loudspeaker.class)) {
        var model = ((Loudspeaker) part.device()).model();
        steps.add(
            words.text(
                "stage.loudspeaker",
                "part",
                PartRows.reference(assembly, block, part.id()),
                "low",
                ohms(rounded(model.dcOhms() * (1 - model.dcToleranceFraction()), false)),
                "high",
                ohms(rounded(model.dcOhms() * (1 + model.dcToleranceFraction()), true))));
      }
    }
    List<String> most = parts.atMost(solved.stage().blocks());
    if (!most.isEmpty()) {
      steps.add(words.text("stage.ohms", "list", String.join("; ", most)));
    }
    return steps;
  }

  /** Three digits, away from what must pass. */
  static double rounded(double si, boolean up) {
    double step = Math.pow(10, Math.floor(Math.log10(si)) - 2);
    // a hair less than a step, so that a round number stays what it is
    return up ? Math.ceil(si / step - 1e-6) * step : Math.floor(si / step + 1e-6) * step;
  }

  private List<String> power(SolvedStage solved) {
    List<String> steps = new ArrayList<>();
    boolean first = solved.stage().number() == 1;
    for (Map.Entry<String, Device> part : solved.partial().devices().entrySet()) {
      String name = part.getKey();
      String reference = assembly.references().ofPart(name).orElse("");
      double across = solved.seriesOhms() * amperes(solved, name, SolvedStage.FIRST_POWER);
      if (!reference.isEmpty() && across > 0) {
        String current =
            words.numbers().text(amperes(solved, name, SolvedStage.AT_REST), Unit.AMPERE);
        double volts = volts(part.getValue());
        steps.add(
            words.text(
                first ? "stage.series" : "stage.series-again",
                "ohms",
                ohms(solved.seriesOhms()),
                "watts",
                words.numbers().plain(rated(volts * volts / solved.seriesOhms()), Unit.WATT),
                "supply",
                reference,
                "volts",
                words.numbers().text(across, Unit.VOLT),
                "amperes",
                current));
        if (first) {
          steps.add(words.text("stage.current", "supply", reference, "amperes", current));
        }
      }
    }
    return steps;
  }

  private static double volts(Device source) {
    return source instanceof Battery battery
        ? battery.model().newVolts()
        : source instanceof Adaptor adaptor ? adaptor.model().ratedVolts() : 0;
  }

  private static double rated(double watts) {
    return RATED_WATTS.stream().filter(rated -> rated >= watts).findFirst().orElse(watts);
  }

  private static double amperes(SolvedStage solved, String source, CaseName caseName) {
    return solved.figures().find(source, Quantity.SUPPLY_AMPERES, caseName).orElse(0);
  }

  private String method(SolvedStage solved, List<StageRow.Point> points) {
    List<Bench.Instrument> owned = assembly.design().bench().instruments();
    String meter = (owned.isEmpty() ? Bench.USUAL.instruments() : owned).get(0).name();
    String key = solved.joints().isEmpty() ? "stage.method-whole" : "stage.method";
    String first = words.text(key, "meter", meter);
    if (points.stream().noneMatch(point -> point.injected().known())) {
      return first;
    }
    String cell = words.numbers().text(SolvedStage.CELL_VOLTS, Unit.VOLT);
    String joined = solved.injectedVolts() > 0 ? "stage.cell" : "stage.cell-reversed";
    return first + " " + words.text(joined, "cell", cell, "ohms", ohms(SolvedStage.JOINT_OHMS));
  }

  /** Points of what is new, and those that read otherwise than in the stage before. */
  private List<StageRow.Point> points(SolvedStage solved, Map<String, Double> before) {
    Set<String> fresh = new LinkedHashSet<>();
    solved.stage().blocks().forEach(block -> fresh.add(block.id()));
    List<StageRow.Point> rows = new ArrayList<>();
    for (PlacedTestPoint point : solved.partial().testPoints()) {
      Amount rest = at(solved, point, SolvedStage.AT_REST);
      Amount injected = at(solved, point, SolvedStage.INJECTED);
      String block = point.place().substring(0, point.place().indexOf('.'));
      double formerly = before.getOrDefault(point.place(), Double.NaN);
      boolean changed = !(Math.abs(rest.si() - formerly) < SAME_VOLTS);
      if (fresh.contains(block) || changed) {
        boolean moves = Math.abs(injected.si() - rest.si()) >= SAME_VOLTS;
        rows.add(
            new StageRow.Point(
                point.reference(),
                names.testPoint(point),
                rest,
                moves ? injected : Amount.none(Unit.VOLT)));
      }
    }
    return rows;
  }

  private static Amount at(SolvedStage solved, PlacedTestPoint point, CaseName caseName) {
    return Amount.of(solved.figures().find(point.place(), Quantity.DC_VOLTS, caseName), Unit.VOLT);
  }

  private List<String> listen(SolvedStage solved) {
    List<String> steps = new ArrayList<>();
    boolean sounds =
        solved.partial().path().stream().anyMatch(b -> b.type().role() == Role.POWER)
            && solved.partial().devices().values().stream().anyMatch(Loudspeaker.class::isInstance);
    if (!sounds) {
      return steps;
    }
    if (solved.joints().isEmpty()) {
      steps.add(words.text("listen.station"));
      return steps;
    }
    String where = where(solved, solved.joints().get(0));
    if (solved.stage().number() == 1) {
      steps.add(words.text("listen.first", "point", where));
    }
    if (solved.injectedVolts() != 0) {
      steps.add(words.text("listen.cell", "point", where));
      steps.add(words.text("listen.silent"));
    }
    return steps;
  }
}
