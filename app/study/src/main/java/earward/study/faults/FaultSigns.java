package earward.study.faults;

import java.util.Objects;

/** A fault and what it shows. */
public record FaultSigns(Fault fault, Signs signs) {
  public FaultSigns {
    Objects.requireNonNull(fault);
    Objects.requireNonNull(signs);
  }
}
