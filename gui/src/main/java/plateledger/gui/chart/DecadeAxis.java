package plateledger.gui.chart;

import java.awt.Graphics2D;
import java.awt.geom.Rectangle2D;
import java.util.ArrayList;
import java.util.List;
import org.jfree.chart.axis.AxisState;
import org.jfree.chart.axis.LogAxis;
import org.jfree.chart.axis.NumberTick;
import org.jfree.chart.axis.TickType;
import org.jfree.chart.ui.RectangleEdge;
import org.jfree.chart.ui.TextAnchor;

/**
 * A logarithmic axis that labels 1, 2 and 5 of each decade (only 1 where there is no room, every whole step where the range is
 * short) and marks 2 to 9. The library's own axis labels powers such as 10^4.4.
 */
final class DecadeAxis extends LogAxis {
    private static final long serialVersionUID = 1L;
    private static final double ROOM_ACROSS = 180.0; // px of a decade for 1-2-5 labels side by side
    private static final double ROOM_UP = 55.0; // the same one above the other
    private static final int FEWEST_LABELS = 2;
    private static final double EDGE = 1e-9; // a tick on the end of the range counts as inside

    DecadeAxis(String title) {
        super(title);
    }

    @Override
    public List<NumberTick> refreshTicks(Graphics2D g2, AxisState state, Rectangle2D dataArea, RectangleEdge edge) {
        boolean across = RectangleEdge.isTopOrBottom(edge);
        double pixels = across ? dataArea.getWidth() : dataArea.getHeight();
        TextAnchor anchor = across ? TextAnchor.TOP_CENTER : TextAnchor.CENTER_RIGHT;
        return ticks(getRange().getLowerBound(), getRange().getUpperBound(), pixels, across ? ROOM_ACROSS : ROOM_UP)
                .stream()
                .map(tick -> new NumberTick(
                        tick.label().isEmpty() ? TickType.MINOR : TickType.MAJOR,
                        tick.value(),
                        tick.label(),
                        anchor,
                        TextAnchor.CENTER,
                        0.0))
                .toList();
    }

    /**
     * One tick.
     *
     * @param value where
     * @param label what is written there; empty for a small tick
     */
    record DecadeTick(double value, String label) {}

    /** The ticks of a range drawn over so many pixels; {@code room} pixels of a decade suffice for labels at 1, 2, 5. */
    static List<DecadeTick> ticks(double low, double high, double pixels, double room) {
        double perDecade = pixels / Math.log10(high / low);
        List<DecadeTick> ticks = inRange(low, high, perDecade >= room ? List.of(1, 2, 5) : List.of(1));
        if (labels(ticks) < FEWEST_LABELS) {
            ticks = inRange(low, high, List.of(1, 2, 5));
        }
        if (labels(ticks) < FEWEST_LABELS) {
            ticks = inRange(low, high, List.of(1, 2, 3, 4, 5, 6, 7, 8, 9));
        }
        return ticks;
    }

    private static long labels(List<DecadeTick> ticks) {
        return ticks.stream().filter(tick -> !tick.label().isEmpty()).count();
    }

    private static List<DecadeTick> inRange(double low, double high, List<Integer> labelled) {
        List<DecadeTick> ticks = new ArrayList<>();
        int last = (int) Math.floor(Math.log10(high) + EDGE);
        for (int exponent = (int) Math.floor(Math.log10(low)); exponent <= last; exponent++) {
            for (int step = 1; step <= 9; step++) {
                double value = step * Math.pow(10.0, exponent);
                if (value >= low * (1.0 - EDGE) && value <= high * (1.0 + EDGE)) {
                    ticks.add(new DecadeTick(value, labelled.contains(step) ? label(step, exponent) : ""));
                }
            }
        }
        return ticks;
    }

    /** Plain digits in groups of three (SI Brochure 9th ed., 5.4.4), e.g. {@code 200 000}, {@code 0.05}. */
    private static String label(int step, int exponent) {
        if (exponent < 0) {
            return "0." + "0".repeat(-exponent - 1) + step;
        }
        String digits = step + "0".repeat(exponent);
        StringBuilder grouped = new StringBuilder();
        for (int i = 0; i < digits.length(); i++) {
            boolean groupEnds = i > 0 && (digits.length() - i) % 3 == 0 && digits.length() > 4;
            grouped.append(groupEnds ? "\u2009" : "").append(digits.charAt(i));
        }
        return grouped.toString();
    }
}
