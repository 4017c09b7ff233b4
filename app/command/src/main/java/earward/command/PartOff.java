package earward.command;

import earward.block.device.Parameter;
import earward.block.quantity.Unit;
import earward.engine.CircuitPart;
import earward.kit.path.Assembly;
import earward.study.batch.WorstKit;
import java.util.ArrayList;
import java.util.List;

/**
 * One value of a drawn kit beside its nominal one.
 *
 * @param part place of the part
 * @param parameter of its law
 * @param unit of both
 * @param nominal the design's value
 * @param value the kit's value
 */
record PartOff(String part, String parameter, Unit unit, double nominal, double value) {
  static List<PartOff> of(Assembly assembly, WorstKit kit) {
    List<PartOff> off = new ArrayList<>();
    for (CircuitPart part : assembly.circuit().parts()) {
      for (Parameter parameter : part.device().parameters()) {
        Double value = kit.values().get(part.name() + ":" + parameter.name());
        if (value != null) {
          off.add(
              new PartOff(
                  part.name(), parameter.name(), parameter.unit(), parameter.nominal(), value));
        }
      }
    }
    return off;
  }

  double share() {
    return nominal == 0 ? 0 : value / nominal - 1;
  }
}
