package plateledger.rig;

import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import plateledger.keyfile.KeyTable;

/**
 * Which channels are used for what: each is used once (per plate), and an instrument of the right kind owns it. Give each
 * plate a {@link #copy()} of what the surroundings use.
 */
final class ChannelUse {
    private final Optional<Map<String, Instrument>> owners;
    private final Map<String, String> uses;

    private ChannelUse(Optional<Map<String, Instrument>> owners, Map<String, String> uses) {
        this.owners = owners;
        this.uses = uses;
    }

    /** Nothing used yet; with no instruments known, owners are not checked. */
    static ChannelUse of(Optional<List<Instrument>> instruments) {
        return new ChannelUse(instruments.map(ChannelUse::byChannel), new HashMap<>());
    }

    ChannelUse copy() {
        return new ChannelUse(owners, new HashMap<>(uses));
    }

    /** Uses a channel, or refuses the key that names it. */
    void use(KeyTable table, String key, String channel, Instrument.SignalKind kind) {
        owners.ifPresent(known -> checkOwner(table, key, channel, kind, Optional.ofNullable(known.get(channel))));
        if (table.sound(key)) {
            String former = uses.putIfAbsent(channel, table.path() + "." + key);
            if (former != null) {
                table.refuse(
                        key,
                        "RIG-CHANNEL-TWICE",
                        "channel " + channel + ", used by " + former + " too",
                        "a channel of its own",
                        "");
            }
        }
    }

    private static void checkOwner(
            KeyTable table, String key, String channel, Instrument.SignalKind kind, Optional<Instrument> owner) {
        if (owner.isEmpty()) {
            table.refuse(
                    key,
                    "RIG-CHANNEL-UNOWNED",
                    "channel " + channel + ", which no instrument owns",
                    "a channel in the list of an instrument",
                    "Add it to channels of an instrument in " + InstrumentReader.FILE + ".");
        } else if (owner.get().kind() != kind) {
            table.refuse(
                    key,
                    "RIG-CHANNEL-KIND",
                    "channel " + channel + " of instrument " + owner.get().id() + ", which measures "
                            + InstrumentReader.word(owner.get().kind()),
                    "a channel that measures " + InstrumentReader.word(kind),
                    "");
        }
    }

    /** Uses each channel of a list. */
    void useAll(KeyTable table, String key, List<String> channels, Instrument.SignalKind kind) {
        channels.forEach(channel -> use(table, key, channel, kind));
    }

    private static Map<String, Instrument> byChannel(List<Instrument> instruments) {
        Map<String, Instrument> owners = new HashMap<>();
        instruments.forEach(owner -> owner.channels().forEach(channel -> owners.putIfAbsent(channel, owner)));
        return owners;
    }
}
