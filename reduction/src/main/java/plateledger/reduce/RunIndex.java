package plateledger.reduce;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import plateledger.campaign.RunType;
import plateledger.rig.Plate;
import plateledger.rig.Rig;
import plateledger.rig.Surroundings;

/**
 * One run as the campaign model sees it: where each of its numbers stands in the input vector. Arrays over junctions and
 * strips are in the plate's order.
 */
final class RunIndex {
    final RunMeans means;
    final Plate plate;
    final InputBook.PlateIndex panel;
    final boolean[] used;
    final List<Optional<Signal>> junctions;
    final Signal[] voltage;
    final Signal[] current;
    final Signal[] wall;
    final Signal[] plenum;
    final Signal[] frame;
    final Signal[] nose;
    final Signal[] tail;
    final Signal[] coverInner;
    final Signal[] coverOuter;
    final Optional<Signal> air;
    final Optional<Signal> pressure;
    final Optional<Signal> humidity;
    final int drift;

    RunIndex(InputBook book, Rig rig, Plate plate, RunMeans means) {
        this.means = means;
        this.plate = plate;
        this.panel = book.plate(plate);
        Surroundings s = rig.surroundings();
        junctions = plate.thermocouples().stream()
                .map(t -> book.signal(means, t.channel()))
                .toList();
        used = new boolean[junctions.size()];
        for (int p = 0; p < used.length; p++) {
            used[p] = junctions.get(p).isPresent();
        }
        voltage = book.signals(
                means,
                plate.heaters().stream().map(Plate.Heater::voltageChannel).toList());
        current = book.signals(
                means,
                plate.heaters().stream().map(Plate.Heater::currentChannel).toList());
        wall = book.signals(means, s.wallChannels());
        plenum = book.signals(means, s.plenumChannels());
        frame = book.signals(means, s.frameChannels());
        nose = book.signals(means, s.noseChannels());
        tail = book.signals(means, s.tailChannels());
        coverInner = book.signals(means, s.coverInnerChannels());
        coverOuter = book.signals(means, s.coverOuterChannels());
        air = book.signal(means, s.airChannel());
        pressure = book.signal(means, s.pressureChannel());
        humidity = book.signal(means, s.humidityChannel());
        drift = book.drift(means);
    }

    /** What this run needs and does not have, in words; empty if it has all. */
    List<String> missing(Rig rig) {
        Surroundings s = rig.surroundings();
        List<String> gone = new ArrayList<>();
        RunType type = means.run().type();
        int strips = plate.heaters().size();
        if (type != RunType.ZERO && (voltage.length < strips || current.length < strips)) {
            gone.add("voltage and current of every strip");
        }
        need(gone, plenum.length > 0, "a plenum temperature", s.plenumChannels());
        need(gone, frame.length > 0, "a frame temperature", s.frameChannels());
        need(gone, nose.length > 0, "a nose temperature", s.noseChannels());
        need(gone, tail.length > 0, "a tail temperature", s.tailChannels());
        if (type == RunType.LOSS) {
            need(gone, coverInner.length > 0, "an inner cover temperature", s.coverInnerChannels());
            need(gone, coverOuter.length > 0, "an outer cover temperature", s.coverOuterChannels());
        } else {
            need(gone, wall.length > 0, "a wall temperature", s.wallChannels());
            need(gone, air.isPresent(), "the air temperature", List.of(s.airChannel()));
            need(gone, pressure.isPresent(), "the barometer", List.of(s.pressureChannel()));
            need(gone, humidity.isPresent(), "the humidity", List.of(s.humidityChannel()));
        }
        int stations = 0;
        for (int p = 0; p < used.length; p++) {
            stations += used[p] && plate.thermocouples().get(p).onCentreLine() ? 1 : 0;
        }
        if (stations < 4) {
            gone.add("at least four centre-line junctions");
        }
        return gone;
    }

    private static void need(List<String> gone, boolean there, String what, List<String> channels) {
        if (!there) {
            gone.add(what + " (" + String.join(", ", channels) + ")");
        }
    }
}
