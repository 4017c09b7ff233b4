package earward.block.device;

/**
 * How near an amplifier's output comes to its rails: lost voltage = volts + ohms · peak current, up
 * towards the supply and down towards ground.
 *
 * @param lostUpVolts at no current, at least 0
 * @param lostUpOhms per ampere of peak current, at least 0
 * @param lostDownVolts at no current, at least 0
 * @param lostDownOhms per ampere of peak current, at least 0
 * @param lostWithoutBootstrapVolts what is lost upwards in addition where the type has a bootstrap
 *     pin and nothing hangs on it, at least 0
 */
public record OutputSwing(
    double lostUpVolts,
    double lostUpOhms,
    double lostDownVolts,
    double lostDownOhms,
    double lostWithoutBootstrapVolts) {
  public OutputSwing {
    Require.notNegative(100, lostUpVolts, "lost voltage up (V)");
    Require.notNegative(1e3, lostUpOhms, "lost voltage up per ampere (Ω)");
    Require.notNegative(100, lostDownVolts, "lost voltage down (V)");
    Require.notNegative(1e3, lostDownOhms, "lost voltage down per ampere (Ω)");
    Require.notNegative(100, lostWithoutBootstrapVolts, "lost voltage without bootstrap (V)");
  }
}
