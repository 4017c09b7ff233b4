package earward.engine.internal;

/** How one figure is read off a solved case. */
@FunctionalInterface
interface Reading {
  /** The figure in the SI unit of its quantity; NaN where it does not exist. */
  double of(CaseWork work);
}
