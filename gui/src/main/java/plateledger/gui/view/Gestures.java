package plateledger.gui.view;

import plateledger.gui.model.FindingScope;

/** What a person can do in the window; the views forward each gesture here and decide nothing. */
public interface Gestures {
    /** Asks for a campaign folder and opens it. */
    void open();

    /** Opens the campaign that was open last. */
    void openLast();

    /** Stops the reduction that runs. */
    void stop();

    /** Chooses a run. */
    void choose(String runId);

    /** Chooses which findings are listed. */
    void listFindings(FindingScope scope);

    /** Puts the notice away. */
    void dismissNotice();

    /** Something could not be done, in a sentence. */
    void problem(String sentence);
}
