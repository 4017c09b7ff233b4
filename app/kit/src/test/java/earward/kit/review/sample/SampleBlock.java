package earward.kit.review.sample;

import static earward.block.wiring.Nodes.GROUND;

import earward.block.BlockDescription;
import earward.block.BlockType;
import earward.block.BlockTypes;
import earward.block.Conditions;
import earward.block.Role;
import earward.block.check.Check;
import earward.block.check.Finding;
import earward.block.device.Resistor;
import earward.block.setting.Setting;
import earward.block.setting.Values;
import earward.block.wiring.Port.Single;
import earward.block.wiring.Wiring;
import java.util.List;
import java.util.Optional;
import java.util.function.ToDoubleFunction;

/** A feed of one resistor with whatever checks and judgement a test gives it. */
public record SampleBlock(List<Check> checks, Judge judge) implements BlockType {

  /** What the block says of itself. */
  @FunctionalInterface
  public interface Judge {
    List<Finding> of(ToDoubleFunction<String> figure);
  }

  public static SampleBlock with(Check... checks) {
    return new SampleBlock(List.of(checks), figure -> List.of());
  }

  /** The set of block types that has only this one. */
  public BlockTypes alone() {
    SampleBlock own = this;
    return new BlockTypes() {
      @Override
      public Optional<BlockType> find(String typeId) {
        return typeId.equals(own.id()) ? Optional.of(own) : Optional.empty();
      }

      @Override
      public List<BlockType> all() {
        return List.of(own);
      }
    };
  }

  @Override
  public String id() {
    return "feed.sample";
  }

  @Override
  public Role role() {
    return Role.FEED;
  }

  @Override
  public List<Setting> settings() {
    return List.of();
  }

  @Override
  public BlockDescription describe(Values values, Conditions conditions) {
    Wiring wiring =
        Wiring.start()
            .at("out")
            .down("r1", new Resistor(1e3), GROUND)
            .testPoint("out", "out")
            .fit("r1")
            .to(new Single("out"));
    return new BlockDescription(wiring, checks, List.of());
  }

  @Override
  public List<Finding> judge(
      Values values, Conditions conditions, ToDoubleFunction<String> figure) {
    return judge.of(figure);
  }
}
