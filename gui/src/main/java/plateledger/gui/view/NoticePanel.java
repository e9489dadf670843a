package plateledger.gui.view;

import java.awt.Font;
import javax.swing.BorderFactory;
import javax.swing.JButton;
import javax.swing.JComponent;
import javax.swing.JLabel;
import javax.swing.JPanel;
import javax.swing.JScrollPane;
import javax.swing.JTextArea;
import javax.swing.UIManager;
import net.miginfocom.swing.MigLayout;
import plateledger.finding.Finding;
import plateledger.finding.Level;
import plateledger.gui.model.Notice;
import plateledger.gui.model.WindowState;

/** What a person must be told: a refusal with all its reasons, a stop, a fault. Hidden when there is nothing to tell. */
public final class NoticePanel {
    private static final int MOST_ROWS = 8;
    private static final int ICON = 16;

    private final JPanel root =
            new JPanel(new MigLayout("ins 8 12 8 12, gap 8 4, hidemode 3", "[grow,fill][]", "[][]"));
    private final JLabel heading = new JLabel(" ");
    private final JTextArea body = new JTextArea();
    private final JScrollPane scroll = new JScrollPane(body);

    /** A hidden notice. */
    public NoticePanel(Gestures gestures) {
        root.setName("notice");
        heading.setName("notice heading");
        heading.setFont(heading.getFont().deriveFont(Font.BOLD));
        body.setName("notice text");
        body.setEditable(false);
        body.setLineWrap(true);
        body.setWrapStyleWord(true);
        JButton away = new JButton("Put away");
        away.setName("put notice away");
        away.setMnemonic('P');
        away.addActionListener(event -> gestures.dismissNotice());
        root.add(heading, "wmin 0");
        root.add(away, "wrap");
        root.add(scroll, "span, wmin 0, growx");
        root.setVisible(false);
    }

    /** The component to lay out. */
    public JComponent component() {
        return root;
    }

    /** Shows the notice of a state. */
    public void render(WindowState state) {
        boolean wasThere = root.isVisible();
        state.notice().ifPresent(this::show);
        root.setVisible(state.notice().isPresent());
        if (wasThere != root.isVisible()) {
            root.revalidate();
        }
    }

    private void show(Notice notice) {
        Level level = notice.findings().stream().map(Finding::level).findFirst().orElse(Level.NOTE);
        heading.setIcon(new LevelIcon(level, ICON));
        heading.setText(notice.heading());
        root.setBorder(BorderFactory.createMatteBorder(0, 0, 1, 0, UIManager.getColor("Component.borderColor")));
        String text = notice.body();
        scroll.setVisible(!text.isEmpty());
        if (!text.equals(body.getText())) {
            body.setText(text);
            body.setRows(Math.min(MOST_ROWS, rows(text)));
            body.setCaretPosition(0);
            root.revalidate();
        }
    }

    /** Lines, counting two for each paragraph long enough to be wrapped in an ordinary window. */
    private static int rows(String text) {
        return text.lines().mapToInt(line -> line.length() > 150 ? 2 : 1).sum();
    }
}
