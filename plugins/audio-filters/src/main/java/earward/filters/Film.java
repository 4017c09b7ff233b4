package earward.filters;

import earward.block.device.Capacitor;
import earward.block.device.Dielectric;

/** Capacitors of filters: film or ceramic, whatever their size. */
final class Film {
  private static final double RATED_VOLTS = 63;

  private Film() {}

  /** Never an electrolytic: no polarity to mind, whichever way round the DC is. */
  static Capacitor of(double farads) {
    Dielectric usual = Dielectric.usualFor(farads);
    return new Capacitor(farads, usual.polarised() ? Dielectric.FILM : usual, RATED_VOLTS, 0, 0);
  }
}
