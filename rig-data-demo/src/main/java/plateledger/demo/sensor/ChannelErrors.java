package plateledger.demo.sensor;

import java.util.HashMap;
import java.util.List;
import java.util.Map;

/**
 * The errors of every channel, drawn once in the group they belong to: the bath, the instrument, the channel, the
 * channel on one day.
 */
public final class ChannelErrors {
    private record Fixed(InstrumentDeclaration instrument, double offset, double gain) {}

    /** Where a run stands between the day's zeros. */
    public enum Moment {
        /** The fan-off zero before the day's runs. */
        FAN_OFF_BEFORE,
        /** The zero run with flow and without power, from which the temperature channels' drift counts. */
        ZERO_RUN,
        /** Any run between. */
        RUN,
        /** The fan-off zero after the day's runs. */
        FAN_OFF_AFTER
    }

    private final Draws draws;
    private final Map<String, Fixed> byChannel = new HashMap<>();

    /** Draws the errors. */
    public ChannelErrors(Draws draws, List<InstrumentDeclaration> instruments) {
        this.draws = draws;
        for (InstrumentDeclaration instrument : instruments) {
            String own = "instrument:" + instrument.id();
            String shared = instrument.bath().isEmpty() ? own : "bath:" + instrument.bath();
            double offset = instrument.offset().draw(draws, shared + "/offset");
            double gain = instrument.gain().draw(draws, own + "/gain");
            for (String channel : instrument.channels()) {
                byChannel.put(
                        channel,
                        new Fixed(
                                instrument,
                                offset + instrument.channelOffset().draw(draws, channel + "/offset"),
                                gain + instrument.channelGain().draw(draws, channel + "/gain")));
            }
        }
    }

    /**
     * What a channel shows for a true value, before noise and rounding.
     *
     * @param channel channel
     * @param day test day
     * @param moment where the run stands between the zeros; a temperature channel's drift counts from
     *     the zero run, any other's from the mean of the two fan-off zeros
     * @param truth true value, SI
     */
    public double reading(String channel, String day, Moment moment, double truth) {
        Fixed fixed = fixed(channel);
        Declared drift = fixed.instrument().dailyDrift();
        boolean thermal = fixed.instrument().kind().equals("temperature");
        double moved = switch (moment) {
            case FAN_OFF_BEFORE -> thermal ? 0.0 : -drift.draw(draws, channel + "/" + day + "/between zeros");
            case FAN_OFF_AFTER -> thermal ? 0.0 : drift.draw(draws, channel + "/" + day + "/between zeros");
            case ZERO_RUN -> thermal ? 0.0 : drift.draw(draws, channel + "/" + day + "/drift");
            case RUN -> drift.draw(draws, channel + "/" + day + "/drift");
        };
        double origin = fixed.instrument().gainOriginSi();
        return origin + (truth - origin + fixed.offset() + moved) / (1.0 - fixed.gain());
    }

    /** One step of a channel's reading, SI. */
    public double resolution(String channel) {
        return fixed(channel).instrument().resolutionSi();
    }

    private Fixed fixed(String channel) {
        Fixed fixed = byChannel.get(channel);
        if (fixed == null) {
            throw new IllegalArgumentException("no instrument for channel " + channel);
        }
        return fixed;
    }
}
