package earward.engine.internal;

import earward.engine.Drive;
import earward.engine.detection.CarrierSurroundings;
import earward.engine.law.DiodeLaw;
import earward.engine.law.DirectStage;
import earward.engine.law.FeedLaw;
import java.util.Locale;

/**
 * The domain in which carrier-averaged detection was proven against the full waveform. Outside it
 * figures may be off by more than they show, and that is said.
 */
final class Domain {
  private static final double LEAST_CARRIER_OVER_TONE = 40;

  /** Harmonics of the tone up to this one must stay well under the carrier. */
  private static final double HARMONICS = 10;

  private static final double SHARE_OF_CARRIER = 1 / 3.0;
  private static final double LEAST_PEAK_VOLTS = 5e-3;
  private static final double MOST_PEAK_VOLTS = 10;
  private static final double LEAST_QUALITY = 5;

  /** Time constant of the detector's load, in carrier cycles. */
  private static final double LEAST_CYCLES = 2;

  private static final double MOST_RECOVERY = 0.005;
  private static final double MOST_JUNCTION_SHARE = 0.1;

  private Domain() {}

  /** What leaves the domain in a solved case, as a sentence without its end; empty inside. */
  static String left(CaseWork work) {
    Detection detection = work.detection;
    FeedLaw feed = work.network.feed;
    if (detection == null || feed == null || work.plan.drive != Drive.SIGNAL) {
      return "";
    }
    double carrier = work.row[work.network.carrierHertz];
    double tone = work.row[work.network.tone];
    double peak = work.peakVolts();
    if (carrier / tone < LEAST_CARRIER_OVER_TONE || HARMONICS * tone > SHARE_OF_CARRIER * carrier) {
      return say(
          feed.seat().name(),
          "the carrier is %.3g times the tone; wanted is at least 40",
          carrier / tone);
    }
    if (peak < LEAST_PEAK_VOLTS || peak > MOST_PEAK_VOLTS) {
      return say(feed.seat().name(), "the carrier's peak is %.3g V; wanted is 5 mV to 10 V", peak);
    }
    if (work.depth() > DepthSearch.MOST) {
      return say(
          feed.seat().name(), "the depth is %.3g %%; wanted is at most 95 %%", 100 * work.depth());
    }
    String tuned = feed.tuned() ? ofTuned(work, feed, carrier) : "";
    return tuned.isEmpty() ? ofDiodes(work, detection, carrier, peak) : tuned;
  }

  private static String ofTuned(CaseWork work, FeedLaw feed, double carrier) {
    double radians = work.carrierRadians();
    double quality = feed.tankFarads(work.stage(), radians) * radians * feed.tankOhms(work.stage());
    double detuning = Math.abs(feed.detuningRadians(work.stage())) / (2 * Math.PI);
    if (quality < LEAST_QUALITY) {
      return say(feed.seat().name(), "the winding's Q is %.3g; wanted is at least 5", quality);
    }
    return detuning > carrier / quality / 2
        ? say(
            feed.seat().name(),
            "the winding is detuned by %.3g Hz, more than half its bandwidth",
            detuning)
        : "";
  }

  private static String ofDiodes(CaseWork work, Detection detection, double carrier, double peak) {
    CarrierSurroundings around = detection.around;
    DirectStage stage = work.stage();
    for (int i = 0; i < work.network.ports.length; i++) {
      if (!(work.network.ports[i].law() instanceof DiodeLaw diode)) {
        continue;
      }
      double reactance = Math.abs(around.carrierImaginaryOhms[around.index(1, i, i)]);
      double direct = around.audioRealOhms[around.index(0, i, i)];
      if (2 * peak * (1 + work.depth()) > diode.model().breakdownVolts()) {
        return say(
            diode.seat().name(), "the diode breaks down at %.3g V", diode.model().breakdownVolts());
      }
      if (carrier * diode.model().recoverySeconds() > MOST_RECOVERY) {
        return say(
            diode.seat().name(),
            "the diode recovers in %.3g of a carrier cycle",
            carrier * diode.model().recoverySeconds());
      }
      if (direct < LEAST_CYCLES * 2 * Math.PI * reactance) {
        return say(
            diode.seat().name(),
            "the load's time constant is %.3g carrier cycles; wanted are at least 2",
            direct / (2 * Math.PI * reactance));
      }
      double junction = diode.junctionFarads(stage) * 2 * Math.PI * carrier * reactance;
      if (junction > MOST_JUNCTION_SHARE) {
        return say(
            diode.seat().name(),
            "the diode's capacitance is %.3g of the reservoir's; wanted is at most a tenth",
            junction);
      }
    }
    return "";
  }

  private static String say(String place, String sentence, double number) {
    return "at '" + place + "' " + String.format(Locale.ROOT, sentence, number);
  }
}
