package earward.kit.proposal;

import earward.block.Proposer;
import earward.block.figure.CaseName;
import earward.block.figure.FigureName;
import earward.block.figure.Quantity;
import earward.block.quantity.Unit;
import earward.block.setting.Setting;
import earward.block.setting.SettingValue;
import earward.kit.design.KitDesign;
import earward.kit.design.QuantityException;
import earward.kit.design.QuantityText;
import earward.kit.path.Assembly;
import earward.kit.path.PlacedBlock;
import earward.kit.proposal.Proposal.Change;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import org.jspecify.annotations.Nullable;

/** What a block's own design equations make of its settings, in values that are at hand. */
final class Equations {
  private static final double NO_LOAD_OHMS = 1e9;
  private static final double SAME = 1e-6;

  private final Bench bench;
  private final PlacedBlock block;
  private final Stock stock;
  private final Set<String> kept;

  Equations(Bench bench, PlacedBlock block, Stock stock, Set<String> kept) {
    this.bench = bench;
    this.block = block;
    this.stock = stock;
    this.kept = kept;
  }

  /** The design with the block's values as its equations give them; empty where none differ. */
  Optional<KitDesign> edited() {
    Optional<Proposer> proposer = block.type().proposer();
    if (proposer.isEmpty()) {
      return Optional.empty();
    }
    Map<String, SettingValue> proposed =
        proposer
            .get()
            .propose(
                new Proposer.Setting(
                    block.values(),
                    bench.design().conditions().core(),
                    ohms(Quantity.BACKWARD_OHMS, block.id(), 0),
                    ohms(Quantity.ONWARD_OHMS, next(), NO_LOAD_OHMS)));
    KitDesign edited = bench.design();
    for (Setting setting : block.type().settings()) {
      Optional<SettingValue> value = atHand(setting, proposed.get(setting.id()));
      if (value.isPresent() && !kept.contains(block.id() + "." + setting.id())) {
        edited = new Edit(block, setting, value.get()).of(edited);
      }
    }
    return edited.equals(bench.design()) ? Optional.empty() : Optional.of(edited);
  }

  /** The proposed value as one that can be had; empty where it is not proposed or not another. */
  private Optional<SettingValue> atHand(Setting setting, @Nullable SettingValue proposed) {
    if (proposed == null) {
      return Optional.empty();
    }
    if (!(setting instanceof Setting.Value value)
        || !(proposed instanceof SettingValue.Amount amount)) {
      return proposed.equals(block.values().all().get(setting.id()))
          ? Optional.empty()
          : Optional.of(proposed);
    }
    double now = block.values().amount(setting.id());
    return stock
        .nearest(amount.number(), value.unit())
        .filter(number -> number >= value.least() && number <= value.most())
        .filter(number -> Math.abs(number / now - 1) > SAME)
        .map(SettingValue.Amount::new);
  }

  private double ohms(Quantity quantity, String into, double none) {
    for (String wire : List.of("", ".plus")) {
      double ohms =
          bench
              .now()
              .figures()
              .orNaN(new FigureName("seam." + into + wire, quantity, CaseName.TEST));
      if (!Double.isNaN(ohms)) {
        return ohms;
      }
    }
    return none;
  }

  /** The block that is entered from this one; itself where none is. */
  private String next() {
    List<PlacedBlock> path = bench.assembly().path();
    for (int i = 0; i + 1 < path.size(); i++) {
      if (path.get(i).id().equals(block.id())) {
        return path.get(i + 1).id();
      }
    }
    return "";
  }

  /** Whether what a change sets can be had: any choice or part, and values of the stock. */
  static boolean inStock(Assembly assembly, Change change, Stock stock) {
    return assembly.block(change.block()).stream()
        .flatMap(block -> block.type().settings().stream())
        .filter(setting -> setting.id().equals(change.setting()))
        .allMatch(
            setting ->
                !(setting instanceof Setting.Value value)
                    || stock.has(number(change.to(), value.unit()), value.unit()));
  }

  private static double number(String words, Unit unit) {
    try {
      return QuantityText.parse(words, unit);
    } catch (QuantityException e) {
      throw new IllegalStateException("what the program wrote it cannot read: " + words, e);
    }
  }
}
