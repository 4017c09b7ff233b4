package earward.kit.file;

import earward.block.device.Pin;
import earward.block.device.Terminal;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;

/** A pin-out as a JSON object: what each pin is, by its number. */
final class PinsForm {
  private static final String PINS = "pins";

  private PinsForm() {}

  static String key(Terminal terminal) {
    return terminal.name().toLowerCase(Locale.ROOT).replace('_', ' ');
  }

  static List<Pin> read(MembersReader in) throws DesignFileException {
    Optional<MembersReader> object = in.open(PINS);
    List<Pin> pins = new ArrayList<>();
    if (object.isPresent()) {
      for (Map.Entry<String, Json.Scalar> member : object.get().allScalars().entrySet()) {
        pins.add(pin(object.get(), member.getKey(), member.getValue()));
      }
    }
    return pins;
  }

  private static Pin pin(MembersReader pins, String number, Json.Scalar value)
      throws DesignFileException {
    if (!number.matches("[1-9][0-9]{0,2}")) {
      throw pins.fault("wrong-form", value, number, "is no pin number; wanted 1 to 999");
    }
    Terminal terminal = pins.choice(number, Terminal.values(), PinsForm::key, Terminal.GROUND);
    return new Pin(Integer.parseInt(number), terminal);
  }
}
