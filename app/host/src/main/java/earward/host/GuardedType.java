package earward.host;

import earward.block.BlockDescription;
import earward.block.BlockType;
import earward.block.Conditions;
import earward.block.Proposer;
import earward.block.Role;
import earward.block.SeamUse;
import earward.block.check.Finding;
import earward.block.setting.Setting;
import earward.block.setting.SettingValue;
import earward.block.setting.Values;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.function.ToDoubleFunction;
import java.util.regex.Pattern;

/**
 * A plug-in's block type behind the guard. What never changes is asked once, on loading. As safe
 * for several threads as the type within.
 */
final class GuardedType implements BlockType {
  private static final Pattern ID = Pattern.compile("[a-z0-9]+([.-][a-z0-9]+)*");

  private final Guard guard;
  private final BlockType within;
  private final String id;
  private final Role role;
  private final List<Setting> settings;

  private GuardedType(Guard guard, BlockType within, String id, Role role, List<Setting> settings) {
    this.guard = guard;
    this.within = within;
    this.id = id;
    this.role = role;
    this.settings = settings;
  }

  /**
   * Puts the guard before a type.
   *
   * @throws PluginFailure where the type does not say who it is
   */
  static GuardedType of(Guard guard, BlockType within) {
    String className = within.getClass().getName();
    String id = guard.call(className + ".id", within::id);
    if (!ID.matcher(id).matches()) {
      throw new PluginFailure(Refusals.badTypeId(guard, className, id), null);
    }
    Role role = guard.call(id + ".role", within::role);
    List<Setting> settings = guard.list(id + ".settings", within::settings);
    Set<String> seen = new HashSet<>();
    for (Setting setting : settings) {
      if (!seen.add(setting.id())) {
        throw new PluginFailure(Refusals.duplicateSetting(guard, id, setting.id()), null);
      }
    }
    return new GuardedType(guard, within, id, role, settings);
  }

  @Override
  public String id() {
    return id;
  }

  @Override
  public Role role() {
    return role;
  }

  @Override
  public List<Setting> settings() {
    return settings;
  }

  @Override
  public BlockDescription describe(Values values, Conditions conditions) {
    try {
      return guard.call(id + ".describe", () -> within.describe(values, conditions));
    } catch (PluginFailure failure) {
      Throwable cause = failure.getCause();
      if (cause != null && cause.getClass() == IllegalArgumentException.class) {
        // not a failure: by its contract the type says so that the settings do not go together
        throw new IllegalArgumentException(cause.getMessage(), cause);
      }
      throw failure;
    }
  }

  @Override
  public Optional<Proposer> proposer() {
    return guard.<Optional<Proposer>>call(id + ".proposer", within::proposer).map(this::guarded);
  }

  private Proposer guarded(Proposer proposer) {
    return asked ->
        guard.<Map<String, SettingValue>>call(
            id + ".propose",
            () -> {
              Map<String, SettingValue> proposed = proposer.propose(asked);
              return proposed == null ? null : Map.copyOf(proposed);
            });
  }

  @Override
  public List<SeamUse> seamUses() {
    return guard.list(id + ".seamUses", within::seamUses);
  }

  @Override
  public List<Finding> judge(
      Values values, Conditions conditions, ToDoubleFunction<String> figure) {
    return guard.list(id + ".judge", () -> within.judge(values, conditions, figure));
  }

  @Override
  public Class<?> besideTexts() {
    return guard.<Class<?>>call(id + ".besideTexts", within::besideTexts);
  }

  @Override
  public String toString() {
    return id + " of " + guard.pluginId();
  }
}
