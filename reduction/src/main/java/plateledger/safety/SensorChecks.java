package plateledger.safety;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.stream.Stream;
import plateledger.campaign.RunType;
import plateledger.finding.Level;
import plateledger.finding.Place;
import plateledger.log.Series;
import plateledger.rig.Plate;
import plateledger.rig.Surroundings;

/**
 * Sensors lost while the heater was on: no usable value for longer than a minute. One of several that serve the same purpose
 * is a caution; all of a role that guards people or the rig at once is a stop.
 */
final class SensorChecks {
    private static final double LONGEST_S = 60.0; // own choice

    private SensorChecks() {}

    /**
     * Channels that serve one purpose.
     *
     * @param name purpose
     * @param channels its channels
     * @param guards true if people or the rig depend on it
     */
    private record Role(String name, List<String> channels, boolean guards) {}

    static void check(RunLog log, Findings findings) {
        RunType type = log.run().type();
        if (type != RunType.HEATED && type != RunType.LOSS) {
            return;
        }
        List<Stretch> heated = log.heated();
        if (heated.isEmpty()) {
            return; // the missing power is said by the power check
        }
        for (Role role : roles(log)) {
            check(log, role, heated, findings);
        }
    }

    private static void check(RunLog log, Role role, List<Stretch> heated, Findings findings) {
        List<Stretch> all = heated;
        List<String> lost = new ArrayList<>();
        Optional<Place> place = Optional.empty();
        double longest = 0.0;
        for (String channel : role.channels()) {
            List<Stretch> gaps = Stretch.common(heated, unusable(log, channel, heated));
            all = Stretch.common(all, gaps);
            Optional<Stretch> gap = Stretch.longest(gaps, LONGEST_S);
            if (gap.isPresent()) {
                lost.add(channel);
                longest = Math.max(longest, gap.get().durationS());
                if (place.isEmpty()) {
                    place = Optional.of(place(log, channel, gap.get()));
                }
            }
        }
        if (lost.isEmpty()) {
            return;
        }
        boolean every = Stretch.longest(all, LONGEST_S).isPresent();
        boolean stop = every && role.guards();
        findings.add(
                stop ? "SENSOR-ROLE-LOST" : "SENSOR-LOST",
                stop ? Level.STOP : Level.CAUTION,
                place.orElse(log.run().place()),
                log.name() + ", " + role.name(),
                "%s without a usable value for up to %s while heated"
                        .formatted(String.join(", ", lost), Findings.seconds(longest)),
                every ? "at least one sensor of this kind at any time" : "every sensor alive",
                stop
                        ? "Do not heat without it: nobody could have seen a limit passed"
                        : "Repair it before the next run",
                "common practice");
    }

    /** When a channel had no usable value: over the whole heating if it is not logged; a lone spike does not count. */
    private static List<Stretch> unusable(RunLog log, String channel, List<Stretch> heated) {
        Optional<Series> found = log.channel(channel);
        if (found.isEmpty() || found.get().size() == 0) {
            return heated;
        }
        Series s = found.get();
        if (s.count(Series.Flag.VALID) == s.size()) {
            return List.of();
        }
        boolean[] lost = new boolean[s.size()];
        for (int i = 0; i < lost.length; i++) {
            lost[i] = s.flags()[i] != Series.Flag.VALID.code() && s.flags()[i] != Series.Flag.SPIKE.code();
        }
        return Stretch.where(log.trueTimes(s), lost);
    }

    private static Place place(RunLog log, String channel, Stretch gap) {
        Optional<Series> found = log.channel(channel);
        if (found.isEmpty()) {
            return log.run().place();
        }
        Series s = found.get();
        double[] times = log.trueTimes(s);
        for (int i = 0; i < times.length; i++) {
            if (times[i] >= gap.fromS()) {
                return new Place(s.file(), s.lines()[i], 0);
            }
        }
        return Place.of(s.file());
    }

    private static List<Role> roles(RunLog log) {
        Surroundings around = log.campaign().rig().surroundings();
        List<Role> roles = new ArrayList<>();
        roles.add(new Role(
                "surface temperature",
                log.plate().thermocouples().stream()
                        .map(Plate.Thermocouple::channel)
                        .toList(),
                true));
        for (Plate.Heater heater : log.plate().heaters()) {
            roles.add(new Role("voltage of strip " + heater.id(), List.of(heater.voltageChannel()), true));
            roles.add(new Role("current of strip " + heater.id(), List.of(heater.currentChannel()), true));
        }
        roles.add(new Role("wall temperature", around.wallChannels(), false));
        roles.add(new Role("plenum temperature", around.plenumChannels(), false));
        roles.add(new Role("frame temperature", around.frameChannels(), false));
        roles.add(new Role("nose temperature", around.noseChannels(), false));
        roles.add(new Role("tail temperature", around.tailChannels(), false));
        if (log.run().type() == RunType.LOSS) {
            roles.add(new Role("inner cover temperature", around.coverInnerChannels(), false));
            roles.add(new Role("outer cover temperature", around.coverOuterChannels(), false));
        } else {
            roles.add(new Role("air temperature", List.of(around.airChannel()), false));
            roles.add(new Role("pressure", List.of(around.pressureChannel()), false));
            roles.add(new Role("humidity", List.of(around.humidityChannel()), false));
            FlowChecks.meter(log).ifPresent(meter -> roles.add(new Role("speed", List.of(meter.channel()), true)));
        }
        return roles.stream()
                .map(role -> new Role(
                        role.name(),
                        Stream.of(role.channels())
                                .flatMap(List::stream)
                                .filter(c -> !c.isEmpty())
                                .toList(),
                        role.guards()))
                .filter(role -> !role.channels().isEmpty())
                .toList();
    }
}
