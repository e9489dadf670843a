package plateledger.reduce;

import java.util.ArrayList;
import java.util.BitSet;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import plateledger.campaign.Campaign;
import plateledger.campaign.Run;
import plateledger.campaign.RunType;
import plateledger.fluid.MoistAir;
import plateledger.ledger.RunLayout;
import plateledger.ledger.RunModel;
import plateledger.quantity.Estimate;
import plateledger.rig.Plate;
import plateledger.rig.Surroundings;
import plateledger.uncertainty.CompositeModel;
import plateledger.uncertainty.InputList;

/**
 * The whole campaign as one pure function of its input vector: zero offsets, loss conductances, all heated runs. One
 * block of outputs per heated run, then one per panel with loss runs (its conductances). Perturbing an input walks the
 * same chain as the best estimate, so that offsets and losses stay correlated with what made them.
 */
final class CampaignModel implements CompositeModel {
    private final InputList inputs;
    private final double[] best;
    private final List<ZeroStage> zeros;
    private final List<LossStage> losses;
    private final List<HeatedStage> heated;
    private final int[][] blocksOf;
    private final boolean[][] zeroReads;
    private final boolean[][] lossReads;
    private final List<double[]> zeroBest = new ArrayList<>();
    private final List<double[]> lossBest = new ArrayList<>();

    private CampaignModel(InputList inputs, List<ZeroStage> zeros, List<LossStage> losses, List<HeatedStage> heated) {
        this.inputs = inputs;
        this.best = inputs.values();
        this.zeros = zeros;
        this.losses = losses;
        this.heated = heated;
        int n = inputs.size();
        zeroReads = new boolean[zeros.size()][n];
        lossReads = new boolean[losses.size()][n];
        BitSet[] blocks = new BitSet[n];
        for (int i = 0; i < n; i++) {
            blocks[i] = new BitSet();
        }
        for (int z = 0; z < zeros.size(); z++) {
            BitSet seen = new BitSet();
            zeros.get(z).configure(Reads.of(best));
            zeroBest.add(zeros.get(z).evaluate(Reads.recording(best, seen)));
            mark(seen, zeroReads[z]);
        }
        for (int l = 0; l < losses.size(); l++) {
            BitSet seen = new BitSet();
            LossStage stage = losses.get(l);
            stage.configure(Reads.of(best), zeroBest);
            lossBest.add(stage.evaluate(Reads.recording(best, seen), zeroBest));
            mark(seen, lossReads[l]);
            for (int z : stage.zeroStages()) {
                merge(zeroReads[z], lossReads[l]);
            }
            toBlock(lossReads[l], heated.size() + l, blocks);
        }
        for (int h = 0; h < heated.size(); h++) {
            BitSet seen = new BitSet();
            HeatedStage stage = heated.get(h);
            stage.configure(Reads.of(best), zeroBest, lossBest);
            stage.inputs(Reads.recording(best, seen), zeroBest, lossBest);
            boolean[] reads = new boolean[n];
            mark(seen, reads);
            if (stage.zeroStage() >= 0) {
                merge(zeroReads[stage.zeroStage()], reads);
            }
            if (stage.lossStage() >= 0) {
                merge(lossReads[stage.lossStage()], reads);
            }
            toBlock(reads, h, blocks);
        }
        blocksOf = new int[n][];
        for (int i = 0; i < n; i++) {
            blocksOf[i] = blocks[i].stream().toArray();
        }
    }

    private static void mark(BitSet seen, boolean[] reads) {
        seen.stream().forEach(i -> reads[i] = true);
    }

    private static void merge(boolean[] from, boolean[] into) {
        for (int i = 0; i < from.length; i++) {
            into[i] |= from[i];
        }
    }

    private static void toBlock(boolean[] reads, int block, BitSet[] blocks) {
        for (int i = 0; i < reads.length; i++) {
            if (reads[i]) {
                blocks[i].set(block);
            }
        }
    }

    /**
     * Builds the model.
     *
     * @param model the model
     * @param refused reason by run id for runs that cannot take part
     * @param warnings what had to be assumed, in words, by run id
     */
    record Built(CampaignModel model, Map<String, String> refused, Map<String, String> warnings) {}

    /** Builds the model of the runs given; runs that lack something are refused with the reason. */
    static Built build(Campaign campaign, List<RunMeans> runs) {
        InputBook book = new InputBook(campaign.rig());
        Map<String, String> refused = new LinkedHashMap<>();
        Map<String, String> warnings = new LinkedHashMap<>();
        List<RunMeans> fanOff = runs.stream()
                .filter(r -> r.run().type() == RunType.FAN_OFF_ZERO)
                .toList();
        InputBook.TunnelIndex tunnel = tunnel(campaign, book, runs);
        List<ZeroStage> zeros = new ArrayList<>();
        List<RunIndex> lossRuns = new ArrayList<>();
        List<Streamed> streamed = new ArrayList<>();
        for (RunMeans r : runs) {
            RunType type = r.run().type();
            Optional<Plate> plate = campaign.rig().plate(r.run().plate());
            if (plate.isEmpty() || type == RunType.FAN_OFF_ZERO || type == RunType.COOL_DOWN) {
                continue;
            }
            RunIndex index = new RunIndex(book, campaign.rig(), plate.get(), r);
            List<String> gone = new ArrayList<>(index.missing(campaign.rig()));
            Optional<StreamStage> stream = type == RunType.LOSS || !gone.isEmpty()
                    ? Optional.empty()
                    : StreamStage.choose(book, campaign.rig(), index, tunnel, fanOff);
            if (type != RunType.LOSS && gone.isEmpty() && stream.isEmpty()) {
                gone.add("a speed meter");
            }
            if (!gone.isEmpty()) {
                refused.put(r.run().id(), "lacks " + String.join("; ", gone));
            } else if (stream.isEmpty()) {
                lossRuns.add(index);
            } else {
                if (!stream.get().zeroed()) {
                    warnings.put(r.run().id(), "no fan-off zero of its speed meter on that day");
                }
                if (type == RunType.ZERO) {
                    zeros.add(new ZeroStage(campaign, index, stream.get(), tunnel));
                } else {
                    streamed.add(new Streamed(index, stream.get()));
                }
            }
        }
        lossRuns.forEach(run -> warn(run, zeros, warnings));
        List<LossStage> losses = lossStages(lossRuns, zeros);
        List<HeatedStage> heated = new ArrayList<>();
        for (Streamed run : streamed) {
            RunIndex index = run.index();
            warn(index, zeros, warnings);
            heated.add(new HeatedStage(
                    campaign, index, run.stream(), tunnel, zeroOf(index, zeros), lossOf(index.plate.id(), losses)));
        }
        CampaignModel model = new CampaignModel(book.build(), zeros, losses, heated);
        return new Built(model, refused, warnings);
    }

    /** Says so where a run's junctions have no zero of its own day; the drift from another day is in no uncertainty. */
    private static void warn(RunIndex run, List<ZeroStage> zeros, Map<String, String> warnings) {
        int zero = zeroOf(run, zeros);
        Run its = run.means.run();
        if (zero < 0) {
            warnings.merge(its.id(), "no zero run of its plate: offsets by certificate", (a, b) -> a + "; " + b);
            return;
        }
        Run used = zeros.get(zero).index().means.run();
        if (!used.day().equals(its.day())) {
            warnings.merge(
                    its.id(),
                    "no zero run of its plate on that day: offsets of " + used.id() + ", " + used.day(),
                    (a, b) -> a + "; " + b);
        }
    }

    /** A heated run with its stream. */
    private record Streamed(RunIndex index, StreamStage stream) {}

    /** Fluid uncertainties at the campaign's mean state. */
    private static InputBook.TunnelIndex tunnel(Campaign campaign, InputBook book, List<RunMeans> runs) {
        Surroundings s = campaign.rig().surroundings();
        double t = meanOf(runs, s.airChannel(), 295.0);
        double p = meanOf(runs, s.pressureChannel(), 1.0e5);
        double rh = meanOf(runs, s.humidityChannel(), 0.4);
        return book.tunnel(t, p, MoistAir.vapourFraction(t, p, rh));
    }

    private static double meanOf(List<RunMeans> runs, String channel, double otherwise) {
        return runs.stream()
                .flatMap(r -> Optional.ofNullable(r.means().get(channel)).stream())
                .mapToDouble(Estimate::value)
                .average()
                .orElse(otherwise);
    }

    private static List<LossStage> lossStages(List<RunIndex> runs, List<ZeroStage> zeros) {
        Map<String, List<RunIndex>> byPlate = new LinkedHashMap<>();
        for (RunIndex run : runs) {
            byPlate.computeIfAbsent(run.plate.id(), id -> new ArrayList<>()).add(run);
        }
        List<LossStage> stages = new ArrayList<>();
        byPlate.values()
                .forEach(list -> stages.add(new LossStage(
                        list, list.stream().mapToInt(run -> zeroOf(run, zeros)).toArray())));
        return stages;
    }

    /** The zero run of a run's plate: of the same day, else the first of the plate; −1 if there is none. */
    private static int zeroOf(RunIndex run, List<ZeroStage> zeros) {
        int any = -1;
        for (int z = 0; z < zeros.size(); z++) {
            RunIndex zero = zeros.get(z).index();
            if (zero.plate.id().equals(run.plate.id())) {
                if (zero.means.run().day().equals(run.means.run().day())) {
                    return z;
                }
                any = any < 0 ? z : any;
            }
        }
        return any;
    }

    private static int lossOf(String plate, List<LossStage> losses) {
        for (int l = 0; l < losses.size(); l++) {
            if (losses.get(l).plate().id().equals(plate)) {
                return l;
            }
        }
        return -1;
    }

    /** The input list. */
    InputList list() {
        return inputs;
    }

    /** Run ids of the heated blocks in block order. */
    List<String> heatedIds() {
        return heated.stream().map(h -> h.index().means.run().id()).toList();
    }

    /** The kernel of a heated block. */
    RunModel kernel(int block) {
        return heated.get(block).kernel();
    }

    /** The layout of a heated block. */
    RunLayout layout(int block) {
        return heated.get(block).kernel().layout();
    }

    /** The run behind a heated block. */
    RunIndex index(int block) {
        return heated.get(block).index();
    }

    /** Loss stages in block order after the heated blocks. */
    List<LossStage> lossStages() {
        return losses;
    }

    /** Power measured − modelled of each loss run of a stage at the best estimate, W. */
    double[] lossResiduals(int stage) {
        return losses.get(stage).residuals(Reads.of(best), zeroBest, lossBest.get(stage));
    }

    @Override
    public int inputs() {
        return inputs.size();
    }

    @Override
    public int blocks() {
        return heated.size() + losses.size();
    }

    @Override
    public int outputs(int block) {
        return block < heated.size() ? heated.get(block).outputs() : LossStage.OUTPUTS;
    }

    @Override
    public int[] blocksOf(int input) {
        return blocksOf[input];
    }

    @Override
    public int arguments(int block) {
        return block < heated.size() ? heated.get(block).arguments() : LossStage.OUTPUTS;
    }

    @Override
    public void evaluate(int block, double[] arguments, double[] out) {
        if (block < heated.size()) {
            heated.get(block).kernel().evaluate(arguments, out);
        } else {
            System.arraycopy(arguments, 0, out, 0, LossStage.OUTPUTS);
        }
    }

    /** Zero offsets and loss conductances are worked out again only where a changed input reaches them. */
    @Override
    public At at(double[] in) {
        Reads reads = Reads.of(in);
        List<double[]> offsets = new ArrayList<>(zeroBest);
        List<double[]> conductances = new ArrayList<>(lossBest);
        for (int z = 0; z < zeros.size(); z++) {
            if (changed(in, zeroReads[z])) {
                offsets.set(z, zeros.get(z).evaluate(reads));
            }
        }
        for (int l = 0; l < losses.size(); l++) {
            if (changed(in, lossReads[l])) {
                conductances.set(l, losses.get(l).evaluate(reads, offsets));
            }
        }
        return (block, arguments) -> {
            double[] made = block < heated.size()
                    ? heated.get(block).inputs(reads, offsets, conductances)
                    : conductances.get(block - heated.size());
            System.arraycopy(made, 0, arguments, 0, made.length);
        };
    }

    private boolean changed(double[] in, boolean[] reads) {
        for (int i = 0; i < reads.length; i++) {
            if (reads[i] && in[i] != best[i]) {
                return true;
            }
        }
        return false;
    }
}
