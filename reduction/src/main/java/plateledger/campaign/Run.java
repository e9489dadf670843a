package plateledger.campaign;

import java.util.Map;
import java.util.Optional;
import plateledger.finding.Place;

/**
 * One run as it was driven; its logs are read elsewhere.
 *
 * @param id unique name, e.g. {@code R07}
 * @param type what it is for
 * @param day test day, the scope of drifts, e.g. {@code 2026-03-10}
 * @param plate id of the plate mounted; empty for runs without one
 * @param regime declared regime; {@link Regime#PRODUCT} for a product panel
 * @param trip trip wire, if any
 * @param speedSetMPerS set speed, m/s; NaN where it does not apply
 * @param powerSetW set total power, W; NaN where it does not apply
 * @param set name of the set point for repeats; runs with the same plate, regime and set point are repeats
 * @param logs log file by logger id, relative to the campaign folder; empty for a planned run
 * @param declaredWindow window chosen by a person, which wins over detection
 * @param leftOut reason for leaving the run out, if it is left out
 * @param note free text
 * @param place where the campaign file declares it
 */
public record Run(
        String id,
        RunType type,
        String day,
        String plate,
        Regime regime,
        Optional<Trip> trip,
        double speedSetMPerS,
        double powerSetW,
        String set,
        Map<String, String> logs,
        Optional<DeclaredWindow> declaredWindow,
        Optional<String> leftOut,
        String note,
        Place place) {

    /**
     * A trip wire.
     *
     * @param xM place from the leading edge, m
     * @param wireM wire diameter, m
     */
    public record Trip(double xM, double wireM) {}

    /**
     * A window chosen by a person.
     *
     * @param startS start, s since 1970-01-01T00:00Z
     * @param endS end, s since 1970-01-01T00:00Z
     * @param reason why
     */
    public record DeclaredWindow(double startS, double endS, String reason) {}

    /** Copies the map. */
    public Run {
        logs = java.util.Collections.unmodifiableMap(new java.util.TreeMap<>(logs));
    }

    /** True if the run has no logs yet. */
    public boolean planned() {
        return logs.isEmpty();
    }
}
