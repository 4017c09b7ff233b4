package earward.block.setting;

import earward.block.device.PartModel;
import java.util.Collections;
import java.util.HashMap;
import java.util.Map;
import java.util.Optional;

/**
 * The settings of one block as they stand: every setting of its type has a value. Immutable.
 *
 * <p>All accessors throw IllegalArgumentException when the type has no such setting or it is of
 * another kind; the host blames the plug-in for it.
 */
public final class Values {
  private final Map<String, SettingValue> byId;

  private Values(Map<String, SettingValue> byId) {
    this.byId = Collections.unmodifiableMap(new HashMap<>(byId));
  }

  /** Values by setting id. */
  public static Values of(Map<String, SettingValue> byId) {
    return new Values(byId);
  }

  /** The number of a value or a trim's target, in its unit. */
  public double amount(String settingId) {
    return get(settingId, SettingValue.Amount.class).number();
  }

  /** The position of a knob, from 0 to 1. */
  public double position(String settingId) {
    return amount(settingId);
  }

  /** The word of a choice. */
  public String choice(String settingId) {
    return get(settingId, SettingValue.Option.class).word();
  }

  /** Whether a choice stands at this word. */
  public boolean chosen(String settingId, String word) {
    return choice(settingId).equals(word);
  }

  /** The figures of a chosen part. */
  public <M extends PartModel> M part(String settingId, Class<M> kind) {
    PartModel model = get(settingId, SettingValue.Chosen.class).model();
    if (!kind.isInstance(model)) {
      throw new IllegalArgumentException(
          "setting '" + settingId + "' holds " + model.kind() + " " + model.name());
    }
    return kind.cast(model);
  }

  /** All values by setting id. */
  public Map<String, SettingValue> all() {
    return byId;
  }

  /** These values with one of them changed. */
  public Values with(String settingId, SettingValue value) {
    Map<String, SettingValue> copy = new HashMap<>(byId);
    copy.put(settingId, value);
    return new Values(copy);
  }

  private <V extends SettingValue> V get(String settingId, Class<V> kind) {
    return Optional.ofNullable(byId.get(settingId))
        .filter(kind::isInstance)
        .map(kind::cast)
        .orElseThrow(
            () ->
                new IllegalArgumentException(
                    "there is no setting '"
                        + settingId
                        + "' of that kind; there are "
                        + byId.keySet()));
  }

  @Override
  public boolean equals(Object other) {
    return other instanceof Values values && values.byId.equals(byId);
  }

  @Override
  public int hashCode() {
    return byId.hashCode();
  }

  @Override
  public String toString() {
    return byId.toString();
  }
}
