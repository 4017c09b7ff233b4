package earward.kit.file;

import earward.block.Conditions;
import earward.block.law.ToneCurve;
import earward.block.quantity.Unit;
import earward.kit.design.AsWritten;
import earward.kit.design.FrontEndCircuits;
import earward.kit.design.FrontEndSupply;
import earward.kit.design.KitConditions;
import earward.kit.design.SidebandPoint;
import earward.kit.design.WantedLimits;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/** The conditions of a design, as a JSON object. */
final class ConditionsForm {
  private static final String FRONT_END = "front end powered by";
  private static final String SIDEBANDS = "front end sidebands";
  private static final String CIRCUITS = "front end tuned circuits";
  private static final String WANTED = "wanted";
  private static final String CURVE = "curve";
  private static final String CORNER = "curve corner";
  private static final String METRES = "listening distance in metres";

  private ConditionsForm() {}

  static KitConditions read(MembersReader in) throws DesignFileException {
    FrontEndSupply frontEnd =
        in.choice(
            FRONT_END, FrontEndSupply.values(), FrontEndSupply::key, FrontEndSupply.NOT_ANSWERED);
    Conditions core = core(in);
    List<SidebandPoint> sidebands = sidebands(in);
    Optional<MembersReader> inside = in.open(CIRCUITS);
    Optional<FrontEndCircuits> circuits =
        inside.isPresent() ? Optional.of(circuits(inside.get())) : Optional.empty();
    Optional<MembersReader> wanted = in.open(WANTED);
    WantedLimits limits =
        wanted.isPresent() ? wanted(wanted.get(), core.highestToneHertz()) : WantedLimits.USUAL;
    try {
      return new KitConditions(core, frontEnd, sidebands, circuits, limits, in.written());
    } catch (IllegalArgumentException e) {
      throw in.impossible(e);
    }
  }

  private static Conditions core(MembersReader in) throws DesignFileException {
    double ambient = in.quantity("ambient", Unit.CELSIUS, 25);
    try {
      return new Conditions(
          in.requiredQuantity("carrier", Unit.HERTZ),
          in.quantity("test tone", Unit.HERTZ, 400),
          in.quantity("highest tone", Unit.HERTZ, 4.5e3),
          in.quantity("lowest tone", Unit.HERTZ, 150),
          in.quantity("test depth", Unit.FRACTION, 0.3),
          in.quantity("deepest depth", Unit.FRACTION, 0.8),
          in.requiredQuantity("weak carrier peak", Unit.VOLT),
          in.requiredQuantity("test carrier peak", Unit.VOLT),
          in.requiredQuantity("strong carrier peak", Unit.VOLT),
          ambient,
          in.quantity("highest ambient", Unit.CELSIUS, Math.max(40, ambient)),
          in.quantity("wanted output", Unit.WATT, 0.1));
    } catch (IllegalArgumentException e) {
      throw in.impossible(e);
    }
  }

  private static List<SidebandPoint> sidebands(MembersReader in) throws DesignFileException {
    List<SidebandPoint> points = new ArrayList<>();
    for (Json item : in.items(SIDEBANDS)) {
      MembersReader point = MembersReader.of(item, in.source(), "a sideband point");
      try {
        points.add(
            new SidebandPoint(
                point.requiredQuantity("offset", Unit.HERTZ),
                point.requiredQuantity("response", Unit.DECIBEL)));
      } catch (IllegalArgumentException e) {
        throw point.impossible(e);
      }
    }
    return points;
  }

  private static FrontEndCircuits circuits(MembersReader in) throws DesignFileException {
    double number = in.requiredQuantity("number", Unit.NUMBER);
    double quality = in.requiredQuantity("quality", Unit.NUMBER);
    in.noteUnknown();
    try {
      if (number != Math.rint(number)) {
        throw new IllegalArgumentException(
            "the front end has " + number + " tuned circuits; wanted is a whole number");
      }
      return new FrontEndCircuits((int) number, quality);
    } catch (IllegalArgumentException e) {
      throw in.impossible(e);
    }
  }

  /** The curve that is named; a corner is of a low-pass only, usually the highest tone. */
  private static Optional<ToneCurve> curve(MembersReader in, double highestToneHertz)
      throws DesignFileException {
    double corner = in.quantity(CORNER, Unit.HERTZ, highestToneHertz);
    if (in.find(CURVE).isEmpty() && in.find(CORNER).isEmpty()) {
      return Optional.empty();
    }
    ToneCurve.Kind kind =
        in.choice(CURVE, ToneCurve.Kind.values(), ToneCurve.Kind::key, ToneCurve.Kind.LOW_PASS);
    return Optional.of(new ToneCurve(kind, corner));
  }

  private static WantedLimits wanted(MembersReader in, double highestToneHertz)
      throws DesignFileException {
    WantedLimits usual = WantedLimits.USUAL;
    try {
      WantedLimits limits =
          new WantedLimits(
              in.quantity("low edge", Unit.HERTZ, usual.lowEdgeHertz()),
              in.quantity("listening level", Unit.WATT, usual.listeningWatts()),
              in.quantity("battery life", Unit.HOUR),
              in.quantity("distortion", Unit.FRACTION, usual.distortion()),
              curve(in, highestToneHertz),
              in.quantity(METRES, Unit.NUMBER, usual.listeningMetres()));
      in.noteUnknown();
      return limits;
    } catch (IllegalArgumentException e) {
      throw in.impossible(e);
    }
  }

  static Json.Members write(KitConditions conditions) {
    Conditions core = conditions.core();
    MembersWriter out = new MembersWriter(conditions.written());
    out.text(FRONT_END, conditions.frontEndSupply().key(), FrontEndSupply.NOT_ANSWERED.key())
        .quantity("carrier", core.carrierHertz(), Unit.HERTZ)
        .quantity("test tone", core.toneHertz(), Unit.HERTZ, 400)
        .quantity("lowest tone", core.lowestToneHertz(), Unit.HERTZ, 150)
        .quantity("highest tone", core.highestToneHertz(), Unit.HERTZ, 4.5e3)
        .quantity("test depth", core.testDepth(), Unit.FRACTION, 0.3)
        .quantity("deepest depth", core.deepestDepth(), Unit.FRACTION, 0.8)
        .quantity("weak carrier peak", core.weakPeakVolts(), Unit.VOLT)
        .quantity("test carrier peak", core.testPeakVolts(), Unit.VOLT)
        .quantity("strong carrier peak", core.strongPeakVolts(), Unit.VOLT)
        .quantity("ambient", core.ambientCelsius(), Unit.CELSIUS, 25)
        .quantity(
            "highest ambient",
            core.highestAmbientCelsius(),
            Unit.CELSIUS,
            Math.max(40, core.ambientCelsius()))
        .quantity("wanted output", core.wantedWatts(), Unit.WATT, 0.1)
        .nested(SIDEBANDS, sidebands(conditions))
        .nested(CIRCUITS, circuits(conditions))
        .nested(WANTED, wanted(conditions));
    return out.done();
  }

  private static Json sidebands(KitConditions conditions) {
    try {
      MembersReader before =
          new MembersReader(
              Kept.object(conditions.written()), new FileSource("kept"), "conditions");
      if (sidebands(before).equals(conditions.sidebands())) {
        return before.find(SIDEBANDS).orElse(Json.array(List.of()));
      }
    } catch (DesignFileException e) {
      throw new IllegalStateException("what was read once cannot be read again", e);
    }
    return Json.array(conditions.sidebands().stream().map(ConditionsForm::point).toList());
  }

  private static Json point(SidebandPoint point) {
    return new MembersWriter(AsWritten.NEW)
        .quantity("offset", point.offsetHertz(), Unit.HERTZ)
        .quantity("response", point.decibels(), Unit.DECIBEL)
        .done();
  }

  private static Json circuits(KitConditions conditions) {
    MembersWriter out = new MembersWriter(Kept.inner(conditions.written(), CIRCUITS));
    Optional<FrontEndCircuits> circuits = conditions.circuits();
    if (circuits.isEmpty()) {
      return out.skip("number").skip("quality").done();
    }
    return out.quantity("number", circuits.get().number(), Unit.NUMBER)
        .quantity("quality", circuits.get().quality(), Unit.NUMBER)
        .done();
  }

  private static Json wanted(KitConditions conditions) {
    WantedLimits limits = conditions.wanted();
    WantedLimits usual = WantedLimits.USUAL;
    MembersWriter out = new MembersWriter(Kept.inner(conditions.written(), WANTED));
    out.quantity("low edge", limits.lowEdgeHertz(), Unit.HERTZ, usual.lowEdgeHertz())
        .quantity("listening level", limits.listeningWatts(), Unit.WATT, usual.listeningWatts());
    if (limits.batteryHours().isPresent()) {
      out.quantity("battery life", limits.batteryHours().getAsDouble(), Unit.HOUR);
    } else {
      out.skip("battery life");
    }
    out.quantity("distortion", limits.distortion(), Unit.FRACTION, usual.distortion());
    if (limits.curve().isPresent()) {
      ToneCurve curve = limits.curve().get();
      double highest = conditions.core().highestToneHertz();
      out.text(CURVE, curve.kind().key(), ToneCurve.Kind.LOW_PASS.key())
          .quantity(CORNER, curve.cornerHertz(), Unit.HERTZ, highest);
    } else {
      out.skip(CURVE).skip(CORNER);
    }
    return out.quantity(METRES, limits.listeningMetres(), Unit.NUMBER, usual.listeningMetres())
        .done();
  }
}
