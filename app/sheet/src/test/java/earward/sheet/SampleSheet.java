package earward.sheet;

import earward.block.check.Severity;
import earward.block.quantity.Unit;
import earward.kit.design.SheetOptions.Paper;
import earward.kit.parts.Marking;
import earward.sheet.content.Amount;
import earward.sheet.content.Building;
import earward.sheet.content.CautionRow;
import earward.sheet.content.CautionRow.Signal;
import earward.sheet.content.CurrentRow;
import earward.sheet.content.FindingRow;
import earward.sheet.content.HeatRow;
import earward.sheet.content.KeyFigure;
import earward.sheet.content.KitTitle;
import earward.sheet.content.PartMarking;
import earward.sheet.content.PartMarking.Body;
import earward.sheet.content.PartMarking.Printed;
import earward.sheet.content.PartRow;
import earward.sheet.content.PathDrawing;
import earward.sheet.content.PinOut;
import earward.sheet.content.PinOut.PinRow;
import earward.sheet.content.SeamRow;
import earward.sheet.content.SheetContent;
import earward.sheet.content.TestPointRow;
import java.awt.BasicStroke;
import java.awt.Font;
import java.awt.geom.Line2D;
import java.util.ArrayList;
import java.util.List;

/** A sheet by hand, with everything that a sheet can say. Its figures are invented. */
final class SampleSheet {
  static final FindingRow STOP =
      new FindingRow(
          Severity.STOP,
          "The junction of IC1 reaches 171 °C; it bears 150 °C.",
          "data sheet",
          List.of("Heat sink of 15 K/W: the junction then stays at 112 °C."));

  private SampleSheet() {}

  static SheetContent healthy() {
    return of("Lantern", List.of(weigh()));
  }

  static SheetContent stopped() {
    return of("Lantern", List.of(STOP, weigh()));
  }

  static FindingRow weigh() {
    return new FindingRow(
        Severity.WEIGH, "The coupling edge lies at 182 Hz; wanted is 150 Hz.", "design", List.of());
  }

  static SheetContent of(String name, List<FindingRow> findings) {
    return new SheetContent(
        new KitTitle(name, "B", "1f2e3d4c", "Reedbank Radio Club", "RRC-7"),
        Paper.A4,
        "en",
        "Detector, volume control and amplifier for an AM receiver.",
        List.of(
            KeyFigure.of("Carrier", volt(1.5), "peak"), KeyFigure.words("Front end", "battery")),
        List.of(
            KeyFigure.of("Output", new Amount(0.41, Unit.WATT), "at clipping"),
            new KeyFigure(
                "Band",
                List.of(new Amount(92, Unit.HERTZ), new Amount(3870, Unit.HERTZ)),
                "−3 dB")),
        List.of(
            new CautionRow(Signal.WARNING, "Mains", "Never to a mains-connected set.", List.of()),
            new CautionRow(Signal.NOTICE, "Polarity", "Mind the stripe.", List.of("C3", "C4"))),
        new PathDrawing(List.of(row(500, 120), row(500, 90))),
        List.of(new PinOut("IC1", "TDA2822M", "DIP-8", pins())),
        parts(40),
        Building.NONE,
        List.of("Black lead to ground, red lead to the point."),
        testPoints(),
        List.of(
            new CurrentRow("BT1, four AA", amp(6e-3), amp(14e-3), amp(0.11), amp(0.15), hours(61))),
        List.of(
            new HeatRow(
                "IC1 TDA2822M",
                watt(0.07),
                watt(0.48),
                celsius(96),
                celsius(150),
                celsius(71),
                new Amount(Double.POSITIVE_INFINITY, Unit.KELVIN_PER_WATT))),
        List.of(seam("IF transformer", "Detector"), seam("Detector", "Volume control")),
        findings);
  }

  private static List<PinRow> pins() {
    List<PinRow> pins = new ArrayList<>();
    for (int i = 1; i <= 8; i++) {
      pins.add(new PinRow(i, "function " + i, i == 5 ? "" : "to C" + i));
    }
    return pins;
  }

  private static PathDrawing.Row row(double width, double height) {
    return new PathDrawing.Row(
        width,
        height,
        graphics -> {
          graphics.setStroke(new BasicStroke(0.8f));
          graphics.draw(new Line2D.Double(0, height / 2, width, height / 2));
          graphics.setFont(new Font("SansSerif", Font.PLAIN, 8));
          graphics.drawString("R1 4.7 kΩ", 40, (float) height / 2 - 4);
        });
  }

  private static List<PartRow> parts(int count) {
    List<PartRow> rows = new ArrayList<>();
    for (int i = 1; i <= count; i++) {
      String group = i < 14 ? "Diode envelope detector" : "Amplifier IC";
      PartMarking bands =
          new PartMarking.Bands(Marking.colourBands(4700, 0.05).orElseThrow(), "4K7");
      PartMarking electrolytic = new Printed(Body.ELECTROLYTIC_CAPACITOR, "220 µF", "220 µF 16 V");
      PartMarking film = new Printed(Body.FILM_CAPACITOR, "104K", "104K or 100n");
      PartMarking marking = i % 3 == 0 ? electrolytic : i % 3 == 1 ? bands : film;
      rows.add(
          new PartRow(
              group, "R" + i, "4.7 kΩ", "0.25 W, ±5 %", marking, "Load", "stripe (−) to ground"));
    }
    return rows;
  }

  private static List<TestPointRow> testPoints() {
    List<TestPointRow> rows = new ArrayList<>();
    for (int i = 1; i <= 7; i++) {
      rows.add(
          new TestPointRow(
              "TP" + i,
              "Wiper of the volume control",
              volt(0),
              volt(-0.412),
              volt(87e-3 / i),
              volt(i == 1 ? 0.31 : 1e-6)));
    }
    rows.add(
        new TestPointRow(
            "TP8",
            "Supply rail",
            volt(6.4),
            volt(6.37),
            Amount.none(Unit.VOLT),
            Amount.none(Unit.VOLT)));
    return rows;
  }

  private static SeamRow seam(String from, String to) {
    return new SeamRow(
        from,
        to,
        "",
        volt(0.123),
        new Amount(0.012, Unit.FRACTION),
        new Amount(1470, Unit.OHM),
        new Amount(18.4e3, Unit.OHM),
        new Amount(0.71, Unit.DECIBEL),
        new Amount(9.2, Unit.DECIBEL));
  }

  private static Amount volt(double volts) {
    return new Amount(volts, Unit.VOLT);
  }

  private static Amount amp(double amperes) {
    return new Amount(amperes, Unit.AMPERE);
  }

  private static Amount watt(double watts) {
    return new Amount(watts, Unit.WATT);
  }

  private static Amount celsius(double celsius) {
    return new Amount(celsius, Unit.CELSIUS);
  }

  private static Amount hours(double hours) {
    return new Amount(hours, Unit.HOUR);
  }
}
