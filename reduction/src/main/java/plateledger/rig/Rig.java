package plateledger.rig;

import java.util.List;
import java.util.Optional;

/**
 * The rig.
 *
 * @param title name of the rig
 * @param plates panels that can be mounted
 * @param surroundings what surrounds them
 * @param instruments instruments with their calibration statements
 * @param limits declared limits
 * @param protections declared protective measures
 */
public record Rig(
        String title,
        List<Plate> plates,
        Surroundings surroundings,
        List<Instrument> instruments,
        Limits limits,
        List<Protection> protections) {
    /** Copies the lists. */
    public Rig {
        plates = List.copyOf(plates);
        instruments = List.copyOf(instruments);
        protections = List.copyOf(protections);
    }

    /** The plate of that id. */
    public Optional<Plate> plate(String id) {
        return plates.stream().filter(plate -> plate.id().equals(id)).findFirst();
    }

    /** The instrument that owns a channel. */
    public Optional<Instrument> instrumentOf(String channel) {
        return instruments.stream()
                .filter(instrument -> instrument.channels().contains(channel))
                .findFirst();
    }
}
