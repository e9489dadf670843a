package plateledger.gui.view;

import java.awt.Color;
import java.awt.Component;
import java.awt.Dimension;
import java.awt.Font;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import javax.swing.ButtonGroup;
import javax.swing.DefaultListCellRenderer;
import javax.swing.DefaultListModel;
import javax.swing.JComponent;
import javax.swing.JLabel;
import javax.swing.JList;
import javax.swing.JPanel;
import javax.swing.JRadioButton;
import javax.swing.JScrollPane;
import javax.swing.JSplitPane;
import javax.swing.JTextArea;
import javax.swing.ListSelectionModel;
import javax.swing.ScrollPaneConstants;
import javax.swing.UIManager;
import net.miginfocom.swing.MigLayout;
import plateledger.finding.Finding;
import plateledger.gui.model.FindingScope;
import plateledger.gui.model.FindingText;
import plateledger.gui.model.Freshness;
import plateledger.gui.model.WindowState;

/** The findings of the chosen run or of the campaign: a list, and the chosen one in full beside it. */
public final class FindingsPanel {
    private static final int ICON = 13;
    private static final int LIST_WIDTH = 320;
    private static final int HEIGHT = 110;
    private static final double LIST_SHARE = 0.45;

    private final JPanel root = new JPanel(new MigLayout("ins 0, gap 6 3, fill", "[][][grow,push]", "[][grow,fill]"));
    private final JLabel heading = new JLabel("Findings");
    private final DefaultListModel<Finding> findings = new DefaultListModel<>();
    private final JList<Finding> list = new JList<>(findings);
    private final JTextArea detail = new JTextArea();
    private final Map<FindingScope, JRadioButton> scopes = new EnumMap<>(FindingScope.class);
    private List<Finding> listed = List.of();

    /** An empty list. */
    public FindingsPanel(Gestures gestures) {
        heading.setFont(heading.getFont().deriveFont(Font.BOLD));
        heading.setLabelFor(list);
        root.add(heading);
        ButtonGroup group = new ButtonGroup();
        for (FindingScope scope : FindingScope.values()) {
            JRadioButton choice = new JRadioButton(scope.word());
            choice.setName("findings of " + scope.word());
            choice.setMnemonic(scope == FindingScope.CHOSEN_RUN ? 'T' : 'W');
            choice.addActionListener(event -> gestures.listFindings(scope));
            group.add(choice);
            scopes.put(scope, choice);
            root.add(choice, scope == FindingScope.CAMPAIGN ? "wrap" : "");
        }
        list.setName("findings");
        list.getAccessibleContext().setAccessibleName("Findings");
        list.setSelectionMode(ListSelectionModel.SINGLE_SELECTION);
        list.setFixedCellWidth(40); // narrower than the pane, so that long lines end in … instead of being cut off
        DefaultListCellRenderer plain = new DefaultListCellRenderer();
        list.setCellRenderer((owner, finding, index, selected, focused) -> {
            Component cell =
                    plain.getListCellRendererComponent(owner, FindingText.line(finding), index, selected, focused);
            if (cell instanceof JLabel label) {
                label.setIcon(new LevelIcon(finding.level(), ICON));
                label.setIconTextGap(6);
            }
            return cell;
        });
        list.addListSelectionListener(event -> showDetail());
        detail.setName("finding");
        detail.setEditable(false);
        detail.setLineWrap(true);
        detail.setWrapStyleWord(true);
        JScrollPane left = new JScrollPane(list);
        left.setHorizontalScrollBarPolicy(ScrollPaneConstants.HORIZONTAL_SCROLLBAR_NEVER);
        JScrollPane right = new JScrollPane(detail);
        right.setPreferredSize(new Dimension(LIST_WIDTH, HEIGHT));
        JSplitPane both = new JSplitPane(JSplitPane.HORIZONTAL_SPLIT, true, left, right);
        left.setPreferredSize(new Dimension(LIST_WIDTH, HEIGHT));
        both.setResizeWeight(LIST_SHARE);
        both.setBorder(null);
        root.add(both, "span, push, grow, wmin 0, hmin 60");
    }

    /** The component to lay out. */
    public JComponent component() {
        return root;
    }

    /** Shows the findings of a state. */
    public void render(WindowState state) {
        scopes.forEach((scope, choice) -> choice.setSelected(scope == state.findingScope()));
        Color faded = UIManager.getColor("Label.disabledForeground");
        boolean former = state.freshness() == Freshness.FORMER && faded != null;
        list.setForeground(former ? faded : UIManager.getColor("List.foreground"));
        detail.setForeground(former ? faded : UIManager.getColor("TextArea.foreground"));
        List<Finding> next = state.findings();
        if (!next.equals(listed)) {
            listed = next;
            findings.clear();
            findings.addAll(next);
            if (!next.isEmpty()) {
                list.setSelectedIndex(0);
            }
        }
        heading.setText("Findings (" + next.size() + ")");
        showDetail();
    }

    private void showDetail() {
        Finding chosen = list.getSelectedValue();
        String text = chosen == null
                ? (listed.isEmpty() ? "Nothing found." : "Choose a finding to read it in full.")
                : FindingText.full(chosen);
        if (!text.equals(detail.getText())) {
            detail.setText(text);
            detail.setCaretPosition(0);
        }
    }
}
