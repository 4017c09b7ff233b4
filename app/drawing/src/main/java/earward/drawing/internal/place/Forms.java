package earward.drawing.internal.place;

import earward.block.device.BipolarTransistor;
import earward.block.device.FieldEffectTransistor;
import earward.block.device.Potentiometer;
import earward.drawing.internal.form.Form;
import earward.drawing.internal.form.Lettering;
import earward.drawing.internal.form.Side;
import earward.drawing.internal.form.Symbols;
import java.util.HashMap;
import java.util.Map;
import java.util.Optional;

/** The symbols of parts, as pieces around the origin. */
final class Forms {
  private Forms() {}

  static Placed twoEnded(Part part, Side way, Lettering lettering) {
    return piece(
        part, Symbols.twoEnded(part.device(), part.entering(), way, part.label(), lettering));
  }

  /** A link of a column, its upper end at the origin. */
  static Placed link(Part part, Lettering lettering) {
    if (part.twoEnded()) {
      return twoEnded(part, Side.DOWN, lettering);
    }
    Form form;
    if (part.device() instanceof BipolarTransistor transistor) {
      form = Symbols.transistor(transistor, part.entering(), part.label(), lettering);
    } else if (part.device() instanceof FieldEffectTransistor transistor) {
      form = Symbols.transistor(transistor, part.entering(), part.label(), lettering);
    } else if (part.device() instanceof Potentiometer track) {
      form = Symbols.track(track, false, part.label(), lettering);
    } else {
      throw new IllegalArgumentException(part.key() + " cannot stand in a column");
    }
    var upper = form.lead(part.entering().name()).orElseThrow();
    return piece(part, form).moved(-upper.x(), -upper.y());
  }

  static Placed piece(Part part, Form form) {
    Map<String, String> nets = new HashMap<>();
    part.nets().forEach((terminal, net) -> nets.put(terminal.name(), net));
    return new Placed(form, 0, 0, part.key(), Optional.empty(), nets);
  }
}
