package earward.engine.internal;

import earward.block.check.Finding;
import earward.block.check.Severity;
import earward.block.figure.CaseName;
import earward.block.figure.FigureName;
import earward.engine.Response;
import earward.engine.Slot;
import earward.engine.SolveOutcome;
import earward.engine.SweptFigures;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.stream.IntStream;
import org.jspecify.annotations.Nullable;

/** All cases of a plan, ready to be solved again and again by one thread. */
public final class Run {
  private static final SolveOutcome WELL = new SolveOutcome(true, List.of());

  private static final String OUTSIDE =
      "In the case '%s' detection is solved outside its proven domain: %s.";

  private static final String CUT_OFF =
      "In the case '%s' figures may be off by more than they show: %s.";

  private final Plan plan;
  private final CaseWork[] works;
  private final double[] nominal;
  private final double[] nominalFigures;
  private @Nullable SolveOutcome nominalOutcome;

  /** Room for a plan. */
  public Run(Plan plan) {
    this.plan = plan;
    nominal = plan.slots().all().stream().mapToDouble(Slot::nominal).toArray();
    nominalFigures = new double[plan.readings.length];
    works =
        plan.cases.stream()
            .map(each -> new CaseWork(plan.network, each, Fineness.USUAL))
            .toArray(CaseWork[]::new);
  }

  /** Solves a row; every solve starts from the nominal kit's solution, which is solved once. */
  public SolveOutcome solve(double[] values, double[] figures) {
    if (nominalOutcome == null) {
      nominalOutcome = readNominal();
      nominalOutcome = withCutOff(nominalOutcome);
      for (CaseWork work : works) {
        if (work.trouble().isEmpty()) {
          work.keep();
        }
      }
    }
    if (Arrays.equals(values, nominal)) {
      System.arraycopy(nominalFigures, 0, figures, 0, figures.length);
      return nominalOutcome;
    }
    return read(values, figures);
  }

  /**
   * The nominal kit, its cases side by side on all cores: each has all that it needs to itself, and
   * somebody waits for it. Kits of a batch have a thread each as it is.
   */
  private SolveOutcome readNominal() {
    IntStream.range(0, works.length).parallel().forEach(this::readNominal);
    return outcome();
  }

  /** One case of the nominal kit, sampled as finely as its solution asks for before it is read. */
  private void readNominal(int at) {
    works[at].begin(nominal);
    while (plan.wantsWhole(at) && works[at].solved() && refine(at)) {
      works[at].begin(nominal);
    }
    for (int i = 0; i < nominalFigures.length; i++) {
      if (plan.caseOf[i] == at) {
        nominalFigures[i] = plan.readings[i].of(works[at]);
      }
    }
  }

  /** Puts a finer case in place of one whose solution asks for it. */
  private boolean refine(int at) {
    Fineness wanted = works[at].wantedFineness();
    if (wanted.equals(works[at].fineness())) {
      return false;
    }
    works[at] = new CaseWork(plan.network, works[at].plan, wanted);
    return true;
  }

  private SolveOutcome read(double[] values, double[] figures) {
    for (CaseWork work : works) {
      work.begin(values);
    }
    for (int i = 0; i < figures.length; i++) {
      figures[i] = plan.readings[i].of(works[plan.caseOf[i]]);
    }
    return outcome();
  }

  private SolveOutcome outcome() {
    boolean well = true;
    boolean inside = true;
    for (CaseWork work : works) {
      well &= work.trouble().isEmpty();
      inside &= !work.done() || Domain.left(work).isEmpty();
    }
    return well && inside ? WELL : outcomeOf(well);
  }

  private SolveOutcome outcomeOf(boolean well) {
    List<Finding> findings = new ArrayList<>();
    for (CaseWork work : works) {
      String name = work.plan.name.text();
      if (!work.trouble().isEmpty()) {
        String sentence = "The kit could not be solved in the case '%s': %s.";
        findings.add(finding(Severity.STOP, "no-solution", sentence, name, work.trouble()));
      } else if (work.done()) {
        say(findings, "outside-domain", OUTSIDE, name, Domain.left(work));
      }
    }
    return new SolveOutcome(well, findings);
  }

  /** The nominal kit's outcome, with what its finest samples still cut off. */
  private SolveOutcome withCutOff(SolveOutcome outcome) {
    List<Finding> findings = new ArrayList<>(outcome.findings());
    for (CaseWork work : works) {
      say(findings, "harmonics-cut-off", CUT_OFF, work.plan.name.text(), Residue.left(work));
    }
    return new SolveOutcome(outcome.solved(), findings);
  }

  private static void say(
      List<Finding> findings, String code, String sentence, String caseName, String what) {
    if (!what.isEmpty()) {
      findings.add(finding(Severity.WEIGH, code, sentence, caseName, what));
    }
  }

  private static Finding finding(
      Severity severity, String code, String sentence, String caseName, String what) {
    return Finding.of(severity, code, caseName, sentence.formatted(caseName, what));
  }

  /** The figures of one case while one value moves. */
  public SweptFigures sweep(
      double[] values, CaseName caseName, String slot, double[] at, List<FigureName> figures) {
    int moved = plan.slots().of(slot);
    int index = caseIndex(caseName);
    CaseWork work = fine(index, nominal, -1, 0);
    List<FigureName> columns =
        figures.stream().filter(figure -> figure.caseName().equals(caseName)).toList();
    List<SweptFigures.Row> rows = new ArrayList<>();
    for (double each : at) {
      work = fine(index, values, moved, each);
      List<Double> row = new ArrayList<>();
      for (int i = 0; i < plan.readings.length; i++) {
        if (plan.caseOf[i] == index) {
          row.add(plan.readings[i].of(work));
        }
      }
      rows.add(new SweptFigures.Row(each, row));
    }
    return new SweptFigures(slot, columns, rows);
  }

  /**
   * Takes over a row with one value of its own (none: −1), in a case that is fine enough for it; a
   * finer one starts from the nominal kit too.
   */
  private CaseWork fine(int index, double[] values, int moved, double value) {
    CaseWork work = works[index];
    while (true) {
      work.begin(values);
      if (moved >= 0) {
        work.set(moved, value);
      }
      boolean solved = work.solved();
      Fineness wanted = solved ? work.wantedFineness() : work.fineness();
      if (wanted.equals(work.fineness())) {
        if (moved < 0 && solved) {
          work.keep();
        }
        return work;
      }
      work = new CaseWork(plan.network, work.plan, wanted);
      works[index] = work;
      work.begin(nominal);
      if (work.solved()) {
        work.keep();
      }
    }
  }

  private int caseIndex(CaseName caseName) {
    for (int i = 0; i < works.length; i++) {
      if (works[i].plan.name.equals(caseName)) {
        return i;
      }
    }
    throw new IllegalArgumentException("there is no case '" + caseName + "' to solve");
  }

  /** The small-signal response at a place, per volt of the envelope before the front end. */
  public Response response(double[] values, CaseName caseName, String place, double[] hertz) {
    List<Response.Point> points = new ArrayList<>();
    for (CaseWork work : works) {
      if (work.plan.name.equals(caseName)) {
        work.begin(values);
        int[] nodes = plan.network.place(place);
        for (double each : hertz) {
          if (work.solved() && SmallResponse.at(work, each)) {
            double scale = SmallResponse.frontEnd(work, each) / work.peakVolts();
            points.add(
                new Response.Point(
                    each,
                    scale * (work.alternating.re(nodes[0]) - work.alternating.re(nodes[1])),
                    scale * (work.alternating.im(nodes[0]) - work.alternating.im(nodes[1]))));
          }
        }
      }
    }
    return new Response(points);
  }
}
