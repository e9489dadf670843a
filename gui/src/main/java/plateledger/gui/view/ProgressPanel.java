package plateledger.gui.view;

import javax.swing.JButton;
import javax.swing.JComponent;
import javax.swing.JLabel;
import javax.swing.JPanel;
import javax.swing.JProgressBar;
import net.miginfocom.swing.MigLayout;
import plateledger.gui.model.Activity;
import plateledger.gui.model.WindowState;

/** How far the reduction is, and the button that stops it. Hidden when nothing runs. */
public final class ProgressPanel {
    private static final int STEPS = 1000;

    private final JPanel root = new JPanel(new MigLayout("ins 6 12 6 12, gap 10", "[grow,fill][240!][]"));
    private final JLabel what = new JLabel(" ");
    private final JProgressBar bar = new JProgressBar(0, STEPS);
    private final JButton stop = new JButton("Cancel");

    /** Hidden. */
    public ProgressPanel(Gestures gestures) {
        root.setName("progress");
        what.setName("progress words");
        bar.setName("progress bar");
        bar.setStringPainted(true);
        stop.setName("cancel");
        stop.setMnemonic('C');
        stop.addActionListener(event -> gestures.stop());
        root.add(what, "wmin 0");
        root.add(bar);
        root.add(stop);
        root.setVisible(false);
    }

    /** The component to lay out. */
    public JComponent component() {
        return root;
    }

    /** Shows the activity of a state. */
    public void render(WindowState state) {
        if (state.activity() instanceof Activity.Working working) {
            String doing = working.stopping() ? "Stopping" : "Reducing";
            what.setText(doing + " " + working.folder() + ": " + working.what());
            bar.setValue((int) Math.round(STEPS * working.fraction()));
            bar.setString(Math.round(100.0 * working.fraction()) + " %");
            stop.setEnabled(state.canStop());
        }
        root.setVisible(state.activity().busy());
    }
}
