package plateledger.reduce;

/** Told how far the work is, and asked whether to go on. Called from worker threads. */
public interface Progress {
    /** Reports nothing and never cancels. */
    Progress NONE = new Progress() {
        @Override
        public void step(String what, double fraction) {}

        @Override
        public boolean cancelled() {
            return false;
        }
    };

    /**
     * Work has got so far.
     *
     * @param what what is being done, a few words
     * @param fraction 0..1 of the whole
     */
    void step(String what, double fraction);

    /** True if the work should stop. */
    boolean cancelled();
}
