package earward.block;

import java.util.List;
import java.util.Optional;

/**
 * The block types that a program has at hand, wherever they came from. A block author has no need
 * of it.
 */
public interface BlockTypes {

  /** The type of this id, where there is one. */
  Optional<BlockType> find(String typeId);

  /** All types, in the order of their ids; an immutable list. */
  List<BlockType> all();
}
