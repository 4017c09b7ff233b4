package earward.kit.file;

/** Designs for the tests, as texts. */
final class Samples {
  static final String NAME = "sample.earward";

  /** Holds everything that a design can hold, and at every level something that is not known. */
  static final String FULL =
      """
      {
        "schema": 1,
        "title": "Sample \\u00e9 \\"quoted\\"",
        "revision": "C",
        "author's note": { "colour": ["red", 1, null], "deep": { "deeper": [] } },
        "conditions": {
          "front end powered by": "selv adaptor",
          "carrier": "465kHz",
          "test tone": 440,
          "lowest tone": "100 Hz",
          "highest tone": "5 kHz",
          "test depth": "40 %",
          "deepest depth": 0.9,
          "weak carrier peak": "0,12 V",
          "test carrier peak": "900 mV",
          "strong carrier peak": "2.5V",
          "ambient": "20 °C",
          "highest ambient": "45 °C",
          "wanted output": "300 mW",
          "moon": "full",
          "front end sidebands": [
            { "offset": "1 kHz", "response": "-0.5 dB", "why": "measured" },
            { "offset": "4500", "response": "-6 dB" }
          ],
          "wanted": { "low edge": "120 Hz", "battery life": "20 h", "smell": "none",
            "curve": "75-microseconds", "listening distance in metres": 2 }
        },
        "path": [
          {
            "id": "feed",
            "type": "feed.tuned-if",
            "settings": { "parallel-ohms": "18k", "quality": 45, "of-later": [1, 2] },
            "remark": "from the junk box"
          },
          {
            "id": "detector",
            "type": "detector.envelope-diode",
            "settings": {
              "diode": {
                "name": "bin 7",
                "material": "germanium",
                "saturation current": "0.4 µA",
                "emission coefficient": 1.15,
                "series resistance": "50 Ω",
                "junction capacitance": "1 pF",
                "drawer": 12
              },
              "c1": "1n5",
              "odd": true
            }
          },
          {
            "id": "mystery",
            "type": "someone.elses-block",
            "rails": { "main": "quiet" },
            "settings": { "knob": "0.047 µF", "table": { "a": [1e3, -0.0] } }
          }
        ],
        "supplies": [{ "id": "battery", "type": "supply.battery", "settings": {} }],
        "take-offs": [
          { "id": "agc", "type": "take-off.agc", "joins at": "detector.out", "since": 1931 }
        ],
        "tolerances": { "resistor": "1 %", "parts": { "filter.r2": "0.5 %" }, "glue": 3 },
        "test points": [
          { "id": "by-hand", "node": "detector.out", "words": "anode", "glow": true }
        ],
        "references": {
          "parts": { "detector.d1": "D7", "gone.r1": "R12" },
          "test points": { "detector.out": "TP3" },
          "stamp": "x"
        },
        "sheet": { "paper": "Letter", "language": "de", "club": "Reedbank Radio Club", "ink": 2 },
        "bench": {
          "instruments": [
            { "name": "old meter", "input resistance": "1MΩ", "accuracy": "2 %", "case": "bakelite" }
          ],
          "lamp": "on"
        }
      }
      """;

  /** The least that a design can be. */
  static final String LEAST =
      """
      {
        "schema": 1,
        "title": "Least",
        "conditions": {
          "carrier": "455 kHz",
          "weak carrier peak": "0.25 V",
          "test carrier peak": "1.5 V",
          "strong carrier peak": "4 V"
        },
        "path": [
          { "id": "detector", "type": "detector.envelope-diode", "settings": { "diode": "BAT46" } }
        ]
      }
      """;

  private Samples() {}
}
