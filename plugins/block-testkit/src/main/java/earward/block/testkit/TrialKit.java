package earward.block.testkit;

import earward.block.BlockDescription;
import earward.block.BlockType;
import earward.block.BlockTypes;
import earward.block.Role;
import earward.block.check.Finding;
import earward.block.check.Severity;
import earward.block.device.AudioAmplifier;
import earward.block.wiring.Nodes;
import earward.block.wiring.Port;
import earward.block.wiring.Port.Single;
import earward.block.wiring.Port.TappedPair;
import earward.block.wiring.WiredPart;
import earward.block.wiring.Wiring;
import earward.kit.design.BlockEntry;
import earward.kit.design.FrontEndSupply;
import earward.kit.design.KitConditions;
import earward.kit.design.KitDesign;
import earward.kit.parts.PartsLibrary;
import earward.kit.path.Assembler;
import earward.kit.path.Assembly;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.TreeSet;

/** The smallest whole kit in which a block can be tried; the block is named {@value #BLOCK}. */
final class TrialKit {
  static final String BLOCK = "block";

  private static final double AUDIO_LOAD_OHMS = 10e3;
  private static final double POWER_LOAD_OHMS = 8;
  private static final double USUAL_VOLTS = 9;

  /** Share of an amplifier's absolute maximum at which it is tried. */
  private static final double SHARE_OF_MAXIMUM = 0.6;

  private final List<FixedBlock> path = new ArrayList<>();
  private final List<FixedBlock> supplies = new ArrayList<>();
  private final List<FixedBlock> takeOffs = new ArrayList<>();
  private final FixedBlock tried;

  private TrialKit(Role role, BlockDescription description) {
    tried = new FixedBlock("trial." + BLOCK, role, description);
  }

  /** The kit around a block; its findings say what does not fit. */
  static Assembly around(BlockType type, BlockDescription description, Variation variation) {
    TrialKit kit = new TrialKit(type.role(), description);
    kit.join(description.wiring());
    return kit.assemble(variation);
  }

  private void join(Wiring wiring) {
    switch (tried.role()) {
      case FEED -> {
        path.add(tried);
        path.add(
            wiring.exit().filter(TappedPair.class::isInstance).isPresent()
                ? TrialBlocks.fullWave()
                : TrialBlocks.detector(false));
        path.add(TrialBlocks.load(new Single("in"), AUDIO_LOAD_OHMS));
      }
      case DETECTOR -> {
        path.add(TrialBlocks.feed(wiring.entry().orElse(new Single("in"))));
        path.add(tried);
        wiring.exit().ifPresent(this::load);
      }
      case SUPPLY, TAKE_OFF -> {
        path.add(TrialBlocks.feed(new Single("in")));
        path.add(TrialBlocks.detector(false));
        path.add(TrialBlocks.consumer(offered(wiring)));
        (tried.role() == Role.SUPPLY ? supplies : takeOffs).add(tried);
      }
      case AUDIO_FILTER, VOLUME, PREAMPLIFIER, POWER, LOAD -> {
        path.add(TrialBlocks.feed(new Single("in")));
        path.add(TrialBlocks.detector(true));
        wiring
            .entry()
            .filter(port -> port.nodes().size() > 1)
            .ifPresent(port -> path.add(TrialBlocks.driver(port)));
        path.add(tried);
        wiring.exit().ifPresent(this::load);
      }
    }
    supplyWhatIsTaken();
  }

  private void load(Port exit) {
    path.add(
        TrialBlocks.load(exit, tried.role() == Role.POWER ? POWER_LOAD_OHMS : AUDIO_LOAD_OHMS));
  }

  private static Set<String> offered(Wiring wiring) {
    return new TreeSet<>(wiring.offeredRails().values());
  }

  private void supplyWhatIsTaken() {
    Set<String> rails = new TreeSet<>();
    double volts = USUAL_VOLTS;
    for (FixedBlock block : path) {
      for (WiredPart part : block.description().wiring().parts()) {
        rails.addAll(part.nodes().values());
        if (part.device() instanceof AudioAmplifier amplifier) {
          volts = Math.min(volts, amplifier.model().ratings().mostVolts() * SHARE_OF_MAXIMUM);
        }
      }
    }
    rails.removeIf(node -> !Nodes.isRail(node));
    supplies.forEach(supply -> rails.removeAll(offered(supply.description().wiring())));
    if (!rails.isEmpty()) {
      supplies.add(TrialBlocks.supply(rails, volts));
    }
  }

  private Assembly assemble(Variation variation) {
    KitDesign design =
        KitDesign.empty("Trial", KitConditions.of(variation.conditions(), FrontEndSupply.BATTERY));
    for (FixedBlock block : path) {
      design = design.addBlock(design.path().size(), entry(block));
    }
    for (FixedBlock supply : supplies) {
      design = design.addSupply(entry(supply));
    }
    for (FixedBlock takeOff : takeOffs) {
      design = design.addTakeOff(entry(takeOff).joiningAt("detector.filtered"));
    }
    return Assembler.assemble(design, new Types(all()), PartsLibrary.EMPTY);
  }

  private List<FixedBlock> all() {
    List<FixedBlock> all = new ArrayList<>(path);
    all.addAll(supplies);
    all.addAll(takeOffs);
    return all;
  }

  private static BlockEntry entry(FixedBlock block) {
    return BlockEntry.of(block.id().substring("trial.".length()), block.id());
  }

  /** Sentences of the findings that weigh most, for messages. */
  static String sentences(List<Finding> findings) {
    return String.join(
        " ",
        findings.stream()
            .filter(finding -> finding.severity() == Severity.STOP)
            .map(Finding::sentence)
            .toList());
  }

  private record Types(List<FixedBlock> blocks) implements BlockTypes {
    @Override
    public Optional<BlockType> find(String typeId) {
      return blocks.stream()
          .filter(block -> block.id().equals(typeId))
          .<BlockType>map(block -> block)
          .findFirst();
    }

    @Override
    public List<BlockType> all() {
      return List.copyOf(blocks);
    }
  }
}
