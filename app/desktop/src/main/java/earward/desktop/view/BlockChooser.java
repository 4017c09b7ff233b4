package earward.desktop.view;

import earward.desktop.model.BlockOffer;
import java.awt.Component;
import java.util.List;
import java.util.Optional;
import org.jspecify.annotations.Nullable;

/** Chooses one of the blocks that can stand in a place. */
final class BlockChooser {
  private BlockChooser() {}

  static Optional<BlockOffer> choose(
      @Nullable Component owner, String title, List<BlockOffer> offers) {
    return new ListDialog<>(
            owner,
            title,
            offers,
            offer -> "<html><b>" + Html.escaped(offer.name()) + "</b>  " + offer.roleName(),
            BlockOffer::matches,
            BlockOffer::help)
        .ask();
  }
}
