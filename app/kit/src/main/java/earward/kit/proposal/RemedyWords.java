package earward.kit.proposal;

import earward.block.BlockTexts;
import earward.block.check.Finding;
import earward.block.check.Finding.Measured;
import earward.block.quantity.Unit;
import earward.block.setting.Setting;
import earward.block.setting.SettingValue;
import earward.kit.design.QuantityText;
import earward.kit.review.Remedy;
import earward.kit.review.ReviewedKit;
import java.util.List;
import java.util.ResourceBundle;

/** Says what an edit changes and what comes of it. */
final class RemedyWords {
  private final Bench bench;
  private final Measured measured;
  private final ResourceBundle words;

  RemedyWords(Bench bench, Measured measured) {
    this.bench = bench;
    this.measured = measured;
    this.words =
        ResourceBundle.getBundle(
            "earward.kit.proposal.texts",
            bench.language(),
            ResourceBundle.Control.getNoFallbackControl(ResourceBundle.Control.FORMAT_PROPERTIES));
  }

  Remedy remedy(Edit edit, ReviewedKit after) {
    BlockTexts texts = BlockTexts.of(edit.block().type(), bench.language());
    SettingValue before = edit.block().values().all().get(edit.setting().id());
    String changed =
        words
            .getString("set")
            .replace("{setting}", texts.get("setting." + edit.setting().id()))
            .replace("{block}", edit.block().id())
            .replace("{from}", before == null ? "" : shown(edit.setting(), before, texts))
            .replace("{to}", shown(edit.setting(), edit.value(), texts));
    return new Remedy(changed + outcome(after) + price(after), edit.of(bench.design()));
  }

  private String shown(Setting setting, SettingValue value, BlockTexts texts) {
    if (value instanceof SettingValue.Amount amount) {
      Unit unit = setting instanceof Setting.Value kind ? kind.unit() : Unit.FRACTION;
      return QuantityText.format(amount.number(), unit, bench.language());
    }
    if (value instanceof SettingValue.Option option) {
      return texts.find("setting." + setting.id() + "." + option.word()).orElse(option.word());
    }
    return ((SettingValue.Chosen) value).model().name();
  }

  private String outcome(ReviewedKit after) {
    double value = after.figures().orNaN(measured.figure());
    if (Double.isNaN(value)) {
      return words.getString("cleared");
    }
    Unit unit = measured.figure().quantity().unit();
    return words
        .getString("outcome")
        .replace("{value}", QuantityText.format(value, unit, bench.language()))
        .replace("{before}", QuantityText.format(measured.value(), unit, bench.language()));
  }

  private String price(ReviewedKit after) {
    List<Finding> added = bench.added(after);
    return added.isEmpty()
        ? ""
        : words.getString("price").replace("{finding}", added.get(0).sentence());
  }
}
