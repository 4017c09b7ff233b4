package earward.desktop.model;

import earward.block.Conditions;
import earward.block.device.Device;
import earward.block.quantity.Series;
import earward.block.setting.Setting;
import earward.block.setting.SettingValue;
import earward.block.setting.Values;
import earward.block.wiring.WiredPart;
import earward.kit.parts.PartsLibrary;
import earward.kit.path.PlacedBlock;
import java.util.Optional;

/**
 * Which setting makes a part what it is: the one of the same name, or else the one that changes the
 * part when it is moved.
 */
final class SettingOfPart {
  private SettingOfPart() {}

  static Optional<Setting> find(
      PlacedBlock block, String partId, Conditions conditions, PartsLibrary library) {
    for (Setting setting : block.type().settings()) {
      if (setting.id().equals(partId)) {
        return Optional.of(setting);
      }
    }
    Optional<Device> now = block.description().wiring().part(partId).map(WiredPart::device);
    for (Setting setting : block.type().settings()) {
      Optional<SettingValue> other = moved(block.values(), setting, library);
      if (other.isPresent() && now.isPresent()) {
        Optional<Device> then = described(block, setting, other.get(), conditions, partId);
        if (then.isPresent() && !then.equals(now)) {
          return Optional.of(setting);
        }
      }
    }
    return block.type().settings().stream().findFirst();
  }

  private static Optional<Device> described(
      PlacedBlock block,
      Setting setting,
      SettingValue value,
      Conditions conditions,
      String partId) {
    try {
      return block
          .type()
          .describe(block.values().with(setting.id(), value), conditions)
          .wiring()
          .part(partId)
          .map(WiredPart::device);
    } catch (IllegalArgumentException e) {
      return Optional.empty(); // this value does not go with the others: nothing is learnt from it
    }
  }

  private static Optional<SettingValue> moved(
      Values values, Setting setting, PartsLibrary library) {
    if (setting instanceof Setting.Value value) {
      double now = values.amount(value.id());
      if (!(now > 0)) {
        return Optional.empty();
      }
      Series series = value.series() == Series.ANY ? Series.E24 : value.series();
      double next = series.next(now) <= value.most() ? series.next(now) : series.previous(now);
      return Optional.of(new SettingValue.Amount(next));
    }
    if (setting instanceof Setting.Part part) {
      SettingValue now = values.all().get(part.id());
      return library.names(part.kind()).stream()
          .flatMap(name -> library.find(part.kind(), name).stream())
          .<SettingValue>map(entry -> new SettingValue.Chosen(entry.model()))
          .filter(chosen -> !chosen.equals(now))
          .findFirst();
    }
    return Optional.empty();
  }
}
