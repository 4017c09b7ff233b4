package earward.kit.file;

import earward.block.quantity.Unit;
import earward.kit.design.Bench;
import earward.kit.design.Bench.AudioRange;
import earward.kit.design.Bench.Instrument;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/** The builder's instruments, as a JSON object. */
final class BenchForm {
  private static final String INSTRUMENTS = "instruments";
  private static final String INPUT = "input resistance";
  private static final String PER_VOLT = "input resistance per volt";
  private static final String ACCURACY = "accuracy";
  private static final String COUNTS = "counts";
  private static final String AUDIO = "audio";

  private BenchForm() {}

  static Bench read(MembersReader in) throws DesignFileException {
    List<Instrument> instruments = new ArrayList<>();
    for (Json item : in.ownItems(INSTRUMENTS)) {
      MembersReader one = MembersReader.of(item, in.source(), "an instrument");
      try {
        instruments.add(instrument(one));
      } catch (IllegalArgumentException e) {
        throw one.impossible(e);
      }
    }
    return new Bench(instruments, in.written());
  }

  private static Instrument instrument(MembersReader one) throws DesignFileException {
    String name = one.requiredText("name");
    double accuracy = one.requiredQuantity(ACCURACY, Unit.FRACTION);
    Optional<MembersReader> inner = one.open(AUDIO);
    Optional<AudioRange> audio =
        inner.isPresent() ? Optional.of(audio(inner.get())) : Optional.empty();
    var perVolt = one.quantity(PER_VOLT, Unit.OHM);
    if (perVolt.isPresent()) {
      return new Instrument(name, perVolt.getAsDouble(), accuracy, 0, audio, one.written());
    }
    double ohms = one.requiredQuantity(INPUT, Unit.OHM);
    double counts = one.quantity(COUNTS, Unit.NUMBER, Instrument.USUAL_COUNTS);
    return new Instrument(name, ohms, accuracy, (int) Math.max(1, counts), audio, one.written());
  }

  private static AudioRange audio(MembersReader in) throws DesignFileException {
    return new AudioRange(
        in.flag("true rms", false),
        in.requiredQuantity("from", Unit.HERTZ),
        in.requiredQuantity("to", Unit.HERTZ),
        in.requiredQuantity("step", Unit.VOLT),
        in.requiredQuantity(ACCURACY, Unit.FRACTION));
  }

  static Json.Members write(Bench bench) {
    return new MembersWriter(bench.written())
        .nested(INSTRUMENTS, Json.array(bench.instruments().stream().map(BenchForm::one).toList()))
        .done();
  }

  private static Json one(Instrument instrument) {
    MembersWriter out = new MembersWriter(instrument.written()).text("name", instrument.name());
    if (instrument.analogue()) {
      out.quantity(PER_VOLT, instrument.inputOhms(), Unit.OHM).skip(INPUT).skip(COUNTS);
    } else {
      out.quantity(INPUT, instrument.inputOhms(), Unit.OHM)
          .quantity(COUNTS, instrument.counts(), Unit.NUMBER, Instrument.USUAL_COUNTS)
          .skip(PER_VOLT);
    }
    out.quantity(ACCURACY, instrument.accuracyFraction(), Unit.FRACTION);
    if (instrument.audio().isEmpty()) {
      return out.skip(AUDIO).done();
    }
    AudioRange audio = instrument.audio().get();
    MembersWriter inner =
        new MembersWriter(Kept.inner(instrument.written(), AUDIO))
            .bare("true rms", Boolean.toString(audio.trueRms()))
            .quantity("from", audio.lowHertz(), Unit.HERTZ)
            .quantity("to", audio.highHertz(), Unit.HERTZ)
            .quantity("step", audio.stepVolts(), Unit.VOLT)
            .quantity(ACCURACY, audio.accuracyFraction(), Unit.FRACTION);
    return out.nested(AUDIO, inner.done()).done();
  }
}
