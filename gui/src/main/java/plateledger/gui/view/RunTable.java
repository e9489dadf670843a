package plateledger.gui.view;

import java.awt.Color;
import java.awt.Component;
import java.util.List;
import javax.swing.JComponent;
import javax.swing.JLabel;
import javax.swing.JScrollPane;
import javax.swing.JTable;
import javax.swing.ListSelectionModel;
import javax.swing.SwingConstants;
import javax.swing.UIManager;
import javax.swing.table.DefaultTableCellRenderer;
import javax.swing.table.TableCellRenderer;
import javax.swing.table.TableRowSorter;
import plateledger.gui.model.Freshness;
import plateledger.gui.model.RunRow;
import plateledger.gui.model.WindowState;

/** The list of runs. */
public final class RunTable {
    private static final int ICON = 12;

    private final RunTableModel rows = new RunTableModel();
    private final JTable table = new JTable(rows);
    private final TableRowSorter<RunTableModel> sorter = new TableRowSorter<>(rows);
    private final JScrollPane root = new JScrollPane(table);
    private long revision;
    private Freshness freshness = Freshness.CURRENT;
    private boolean showing;

    /** An empty list. */
    public RunTable(Gestures gestures) {
        table.setName("runs");
        table.getAccessibleContext().setAccessibleName("Runs of the campaign");
        table.setSelectionMode(ListSelectionModel.SINGLE_SELECTION);
        table.setAutoResizeMode(JTable.AUTO_RESIZE_SUBSEQUENT_COLUMNS);
        table.setFillsViewportHeight(true);
        table.getTableHeader().setReorderingAllowed(false);
        table.setRowSorter(sorter);
        for (int column = 0; column < rows.getColumnCount(); column++) {
            RunTableModel.Column kind = RunTableModel.Column.at(column);
            table.getColumnModel().getColumn(column).setPreferredWidth(kind.width());
            table.getColumnModel().getColumn(column).setCellRenderer(renderer(kind));
        }
        table.getSelectionModel().addListSelectionListener(event -> {
            int row = table.getSelectedRow();
            if (!event.getValueIsAdjusting() && !showing && row >= 0) {
                gestures.choose(rows.row(table.convertRowIndexToModel(row)).id());
            }
        });
    }

    /** The component to lay out. */
    public JComponent component() {
        return root;
    }

    /** Shows the runs of a state and the one chosen. */
    public void render(WindowState state) {
        showing = true; // what follows is not a gesture
        if (revision != state.revision()) {
            revision = state.revision();
            rows.show(state.shown().map(shown -> RunRow.of(shown.result())).orElse(List.of()));
        }
        if (freshness != state.freshness()) {
            freshness = state.freshness();
            table.repaint();
        }
        state.chosenRun().ifPresentOrElse(this::select, table::clearSelection);
        showing = false;
    }

    private void select(String runId) {
        int model = rows.indexOf(runId);
        int row = model < 0 ? -1 : table.convertRowIndexToView(model);
        if (row >= 0 && table.getSelectedRow() != row) {
            table.setRowSelectionInterval(row, row);
            table.scrollRectToVisible(table.getCellRect(row, 0, true));
        }
    }

    private TableCellRenderer renderer(RunTableModel.Column column) {
        DefaultTableCellRenderer plain = new DefaultTableCellRenderer();
        plain.setHorizontalAlignment(column.number() ? SwingConstants.RIGHT : SwingConstants.LEFT);
        return (JTable owner, Object value, boolean selected, boolean focused, int row, int index) -> {
            Component cell = plain.getTableCellRendererComponent(owner, value, selected, focused, row, index);
            RunRow run = rows.row(owner.convertRowIndexToModel(row));
            if (cell instanceof JLabel label) {
                label.setToolTipText(RunTableModel.tip(column, run));
                label.setIcon(
                        column == RunTableModel.Column.FINDINGS
                                ? run.gravest()
                                        .map(level -> new LevelIcon(level, ICON))
                                        .orElse(null)
                                : null);
            }
            if (!selected) {
                cell.setForeground(ink(owner));
            }
            return cell;
        };
    }

    private Color ink(JTable owner) {
        Color faded = UIManager.getColor("Label.disabledForeground");
        return freshness == Freshness.FORMER && faded != null ? faded : owner.getForeground();
    }
}
