package earward.kit.review;

import static earward.block.figure.CaseName.DEEPEST;
import static earward.block.figure.CaseName.TEST;

import earward.block.Role;
import earward.block.figure.CaseName;
import earward.block.figure.FigureName;
import earward.block.figure.Quantity;
import earward.engine.CircuitPart;
import earward.engine.Seam;
import earward.kit.path.Figures;
import earward.kit.path.PlacedBlock;
import earward.kit.path.SolvedKit;
import java.util.List;

/**
 * How two blocks get on at the seam where they meet, judged by what is really lost there and by the
 * limits of what follows, not by a ratio of impedances.
 */
public enum SeamVerdict {
  /** Nothing is lost that is wanted, and nothing is driven beyond what it bears. */
  FITS("fits"),
  /** The test signal drives what follows beyond its limit. */
  OVERDRIVEN("overdriven"),
  /** The test signal is too near the noise here. */
  NOISY("noisy"),
  /** What hangs on here lets the detector go before the deepest modulation wanted. */
  CLIPS_THE_DETECTOR("clips-the-detector"),
  /** The weakest station comes out short, and what is lost here would make up for it. */
  COSTLY_LOSS("costly-loss");

  /** Least signal to noise of the test signal, dB (common practice of a usable signal). */
  private static final double LEAST_SIGNAL_TO_NOISE = 20;

  /** A loss below this is not worth an edit, dB (judgement). */
  private static final double LEAST_LOSS = 1;

  private static final CaseName WEAKEST = new CaseName("weak-at-full-volume");

  private final String key;

  SeamVerdict(String key) {
    this.key = key;
  }

  /** The verdict as written in JSON. */
  public String key() {
    return key;
  }

  /**
   * The verdict on one seam of a solved kit.
   *
   * @param kit the kit
   * @param seam a seam of its circuit; of a pair, either wire
   */
  public static SeamVerdict of(SolvedKit kit, Seam seam) {
    String into = seam.name().split("\\.", 2)[0];
    Figures figures = kit.figures();
    String level = "seam." + into;
    if (figures.orNaN(new FigureName(level, Quantity.HEADROOM_DECIBELS, TEST)) < 0) {
      return OVERDRIVEN;
    }
    double signal = figures.orNaN(new FigureName(level, Quantity.AUDIO_RMS_VOLTS, TEST));
    double noise = figures.orNaN(new FigureName(level, Quantity.NOISE_RMS_VOLTS, TEST));
    if (Double.isNaN(noise)) {
      return FITS; // the carrier's seam: what is lost there is the feed's match
    }
    if (20 * Math.log10(signal / noise) < LEAST_SIGNAL_TO_NOISE) {
      return NOISY;
    }
    if (behindDetector(kit, into) && loadClips(kit)) {
      return CLIPS_THE_DETECTOR;
    }
    double loss =
        figures.orNaN(new FigureName("seam." + seam.name(), Quantity.LOADING_LOSS_DECIBELS, TEST));
    double shortage = shortage(kit);
    return shortage > 0 && loss >= Math.max(LEAST_LOSS, shortage) ? COSTLY_LOSS : FITS;
  }

  /** By how much the weakest station at full volume falls short of the listening level, dB. */
  private static double shortage(SolvedKit kit) {
    double wanted = kit.assembly().design().conditions().wanted().listeningWatts();
    double watts = kit.figures().orNaN(new FigureName("path", Quantity.OUTPUT_WATTS, WEAKEST));
    return 10 * Math.log10(wanted / watts);
  }

  private static boolean behindDetector(SolvedKit kit, String into) {
    List<PlacedBlock> path = kit.assembly().path();
    for (int i = 1; i < path.size(); i++) {
      if (path.get(i).id().equals(into)) {
        return path.get(i - 1).type().role() == Role.DETECTOR;
      }
    }
    return false;
  }

  /** Whether a detector lets go by what is coupled on, its reservoir being innocent. */
  private static boolean loadClips(SolvedKit kit) {
    double wanted = kit.assembly().design().conditions().core().deepestDepth();
    for (CircuitPart part : kit.assembly().circuit().parts()) {
      double depth =
          kit.figures().orNaN(new FigureName(part.name(), Quantity.CLIPPING_DEPTH, DEEPEST));
      boolean byLoad =
          ClippingCause.of(kit.figures(), part.name(), DEEPEST)
              .filter(cause -> cause != ClippingCause.DIAGONAL)
              .isPresent();
      if (depth < wanted && byLoad) {
        return true;
      }
    }
    return false;
  }
}
