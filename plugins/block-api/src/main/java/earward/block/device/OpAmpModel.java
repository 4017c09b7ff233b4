package earward.block.device;

/**
 * An operational amplifier: one pole and limits.
 *
 * @param name part type
 * @param openLoopGain at DC, plain number, above 1
 * @param unityGainHertz gain-bandwidth product, above 0
 * @param inputOhms differential input resistance, above 0
 * @param outputOhms open-loop output resistance, above 0
 * @param lostVoltsUp how near the output comes to the supply, at least 0
 * @param lostVoltsDown how near it comes to ground, at least 0
 * @param quiescentAmperes supply current at rest, at least 0
 * @param biasAmperes current that each input takes, at least 0
 * @param noiseVoltsPerRootHertz input noise density, at least 0
 * @param leastVolts lowest supply
 * @param mostVolts absolute maximum supply
 */
public record OpAmpModel(
    String name,
    double openLoopGain,
    double unityGainHertz,
    double inputOhms,
    double outputOhms,
    double lostVoltsUp,
    double lostVoltsDown,
    double quiescentAmperes,
    double biasAmperes,
    double noiseVoltsPerRootHertz,
    double leastVolts,
    double mostVolts)
    implements PartModel {
  public OpAmpModel {
    Require.named(name, "op-amp");
    Require.above(1, openLoopGain, name + ": open-loop gain");
    Require.atMost(1e9, openLoopGain, name + ": open-loop gain");
    Require.positive(1e12, unityGainHertz, name + ": gain-bandwidth product (Hz)");
    Require.positive(1e15, inputOhms, name + ": input resistance (Ω)");
    Require.positive(1e6, outputOhms, name + ": output resistance (Ω)");
    Require.notNegative(100, lostVoltsUp, name + ": lost voltage up (V)");
    Require.notNegative(100, lostVoltsDown, name + ": lost voltage down (V)");
    Require.notNegative(10, quiescentAmperes, name + ": quiescent current (A)");
    Require.notNegative(1, biasAmperes, name + ": bias current (A)");
    Require.notNegative(1, noiseVoltsPerRootHertz, name + ": input noise");
    Require.positive(1e3, leastVolts, name + ": lowest supply (V)");
    Require.above(leastVolts, mostVolts, name + ": absolute maximum supply (V)");
  }

  @Override
  public PartKind kind() {
    return PartKind.OP_AMP;
  }
}
