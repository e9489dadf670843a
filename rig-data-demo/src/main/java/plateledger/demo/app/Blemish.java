package plateledger.demo.app;

import java.util.List;

/**
 * Something that went wrong in a log, as it does.
 *
 * @param run run
 * @param logger logger
 * @param channel channel; empty if whole rows are concerned
 * @param fromRow first data row, from 0
 * @param toRow row after the last
 * @param kind what
 */
record Blemish(String run, String logger, String channel, int fromRow, int toRow, Kind kind) {
    /** What goes wrong. */
    enum Kind {
        /** The logger's own marker for a signal out of its range. */
        OVER_RANGE,
        /** Nothing in the cell. */
        EMPTY,
        /** Rows missing. */
        GAP,
        /** The last value repeated. */
        STUCK,
        /** One wild value. */
        SPIKE
    }

    /** Those of the demo campaign, all while the run is steady. */
    static final List<Blemish> ALL = List.of(
            new Blemish("B05", "power", "I3", 700, 701, Kind.OVER_RANGE),
            new Blemish("B07", "plate", "T08", 620, 621, Kind.SPIKE),
            new Blemish("B12", "plate", "T05", 600, 602, Kind.OVER_RANGE),
            new Blemish("P04", "plate", "T11", 1200, 1201, Kind.EMPTY),
            new Blemish("P07", "tunnel", "", 1500, 1560, Kind.GAP),
            new Blemish("P10", "plate", "T19", 300, Integer.MAX_VALUE, Kind.STUCK));

    /** True if this blemish hits a cell (or, without a channel, a row). */
    boolean hits(String runId, String loggerId, String cell, int row) {
        return run.equals(runId) && logger.equals(loggerId) && channel.equals(cell) && row >= fromRow && row < toRow;
    }
}
