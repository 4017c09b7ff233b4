package earward.engine.internal;

import earward.block.figure.CaseName;
import earward.engine.Drive;
import earward.engine.law.DirectStage;
import earward.engine.law.FeedLaw;
import earward.engine.law.Law;
import earward.engine.law.WaveformStage;
import earward.engine.waveform.FullWaveform;
import earward.engine.waveform.WaveformListener;
import earward.engine.waveform.WaveformPlace;
import earward.engine.waveform.WaveformResult;
import earward.engine.waveform.WaveformSettings;
import earward.engine.waveform.WaveformTask;
import java.util.List;

/** One case of a plan as a full waveform: the DC point at rest, from there on its own equations. */
public final class WaveformRun {
  private final Network network;
  private final double[] row;
  private final FeedLaw feed;

  /**
   * A case with its row.
   *
   * @throws IllegalArgumentException when there is no such case, or nothing that drives it
   */
  public WaveformRun(Plan plan, double[] values, CaseName caseName) {
    network = plan.network;
    row = new double[values.length];
    CasePlan found =
        plan.cases.stream()
            .filter(each -> each.name.equals(caseName))
            .findFirst()
            .orElseThrow(
                () -> new IllegalArgumentException("there is no case '" + caseName + "' to solve"));
    if (found.drive != Drive.SIGNAL || network.feed == null) {
      throw new IllegalArgumentException("no carrier drives the case '" + caseName + "'");
    }
    found.apply(values, row);
    feed = network.feed;
  }

  /** Runs it, from the point at rest. */
  public WaveformResult solve(WaveformSettings settings, WaveformListener listener) {
    DirectSolver direct = new DirectSolver(network);
    direct.stage().state(row, row[network.ambient], true, false);
    double carrier = 2 * Math.PI * row[network.carrierHertz];
    List<WaveformPlace> measured =
        settings.places().stream()
            .map(place -> new WaveformPlace(place, nodes(place)[0], nodes(place)[1]))
            .toList();
    WaveformTask task =
        new WaveformTask(
            row[network.carrierHertz],
            row[network.carrierPeak],
            row[network.depth],
            row[network.tone],
            feed.tankOhms(direct.stage()),
            feed.tankFarads(direct.stage(), carrier),
            feed.detuningRadians(direct.stage()),
            settings.peaked(),
            measured,
            settings.squares());
    if (!direct.solve()) {
      String what = "no DC solution; it was worst at " + direct.worst();
      return WaveformResult.without(task, what);
    }
    try {
      return new FullWaveform(
              (tuning, quiet) -> stamped(direct.stage(), carrier, tuning, quiet), task, listener)
          .solve();
    } catch (IllegalArgumentException e) {
      return WaveformResult.without(task, String.valueOf(e.getMessage()));
    }
  }

  private int[] nodes(String place) {
    return network.place(place);
  }

  private WaveformStage stamped(DirectStage point, double carrier, double tuning, boolean quiet) {
    WaveformStage stage =
        new WaveformStage(network.nodes, network.size, point, carrier, tuning, quiet);
    for (Law law : network.laws) {
      law.waveform(stage);
    }
    for (int i = 0; i < network.probePlus.length; i++) {
      stage.conductance(
          network.probePlus[i], network.probeMinus[i], point.value(network.probeMeter[i]));
    }
    for (int i = 0; i < network.seamBefore.length; i++) {
      int branch = network.firstSeamBranch + i;
      stage.branchCurrent(branch, network.seamBefore[i], network.seamAfter[i]);
      stage.term(branch, network.seamBefore[i], 1);
      stage.term(branch, network.seamAfter[i], -1);
    }
    return stage;
  }
}
