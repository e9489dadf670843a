package plateledger.reduce;

import java.util.LinkedHashSet;
import java.util.Set;
import plateledger.campaign.Campaign;
import plateledger.campaign.Run;
import plateledger.campaign.RunType;
import plateledger.rig.Plate;
import plateledger.rig.Surroundings;

/** The channels that the logs of a run must hold, by its type. */
final class ExpectedChannels {
    private ExpectedChannels() {}

    static Set<String> of(Campaign campaign, Run run) {
        Set<String> names = new LinkedHashSet<>();
        Surroundings s = campaign.rig().surroundings();
        if (run.type() == RunType.FAN_OFF_ZERO) {
            s.speedMeters().forEach(meter -> names.add(meter.channel()));
            return names;
        }
        campaign.rig().plate(run.plate()).ifPresent(plate -> {
            plate.thermocouples().forEach(t -> names.add(t.channel()));
            if (run.type() == RunType.LOSS || run.type() == RunType.HEATED) {
                addHeaters(plate, names);
            }
        });
        names.addAll(s.plenumChannels());
        names.addAll(s.frameChannels());
        names.addAll(s.noseChannels());
        names.addAll(s.tailChannels());
        if (run.type() == RunType.LOSS) {
            names.addAll(s.coverInnerChannels());
            names.addAll(s.coverOuterChannels());
        } else {
            names.addAll(s.wallChannels());
            names.add(s.airChannel());
            names.add(s.pressureChannel());
            names.add(s.humidityChannel());
            s.speedMeters().forEach(meter -> names.add(meter.channel()));
        }
        return names;
    }

    private static void addHeaters(Plate plate, Set<String> names) {
        plate.heaters().forEach(heater -> {
            names.add(heater.voltageChannel());
            names.add(heater.currentChannel());
        });
    }
}
