package plateledger.campaign;

/** What a run is for; each type has its own checks. The words are those of the campaign file. */
public enum RunType {
    /** Heater off, fan off: zeros of pressure transducers and anemometers. */
    FAN_OFF_ZERO("fan-off zero"),
    /** Heater off, highest speed, isothermal: zeros of the plate's thermocouples. */
    ZERO("zero"),
    /** Heated with the cover on and no flow, on purpose: identifies losses. */
    LOSS("loss"),
    /** Heated in the stream: what the campaign is for. */
    HEATED("heated"),
    /** Cooling after a heated run. */
    COOL_DOWN("cool-down");

    private final String word;

    RunType(String word) {
        this.word = word;
    }

    /** The word in the campaign file. */
    public String word() {
        return word;
    }
}
