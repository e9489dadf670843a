package plateledger.uncertainty;

/**
 * The group within which one draw of an input is shared: an error common to a day is the same number in every run of
 * that day. Written {@code run:R07}, {@code day:2026-03-10}, {@code panel:product}, {@code instrument:voltmeter},
 * {@code bath:A}, {@code campaign}, {@code rig}.
 *
 * @param kind the kind of group
 * @param member which one; empty for {@link Kind#CAMPAIGN} and {@link Kind#RIG}
 */
public record Scope(Kind kind, String member) {
    /** Kinds of groups, narrowest first. */
    public enum Kind {
        /** One run: random from run to run. */
        RUN,
        /** One test day. */
        DAY,
        /** One mounting of a panel. */
        MOUNT,
        /** One panel under test. */
        PANEL,
        /** One instrument. */
        INSTRUMENT,
        /** All channels calibrated in one bath. */
        BATH,
        /** The campaign. */
        CAMPAIGN,
        /** The rig, in every campaign on it. */
        RIG
    }

    /** The campaign-wide scope. */
    public static final Scope CAMPAIGN = new Scope(Kind.CAMPAIGN, "");
    /** The rig-wide scope. */
    public static final Scope RIG = new Scope(Kind.RIG, "");

    /** The scope of one run. */
    public static Scope run(String id) {
        return new Scope(Kind.RUN, id);
    }

    /** The scope of one test day. */
    public static Scope day(String day) {
        return new Scope(Kind.DAY, day);
    }

    /** The scope of one panel. */
    public static Scope panel(String panel) {
        return new Scope(Kind.PANEL, panel);
    }

    /** The scope of one instrument. */
    public static Scope instrument(String instrument) {
        return new Scope(Kind.INSTRUMENT, instrument);
    }

    /** The scope of one calibration bath. */
    public static Scope bath(String bath) {
        return new Scope(Kind.BATH, bath);
    }

    /** True if the input is drawn anew for each run. */
    public boolean isRun() {
        return kind == Kind.RUN;
    }

    /** The scope as written in budgets, e.g. {@code day:2026-03-10}. */
    @Override
    public String toString() {
        String word = kind.name().toLowerCase(java.util.Locale.ROOT);
        return member.isEmpty() ? word : word + ":" + member;
    }
}
