package plateledger.gui.view;

import java.util.List;
import javax.swing.event.EventListenerList;
import javax.swing.event.TableModelEvent;
import javax.swing.event.TableModelListener;
import javax.swing.table.TableModel;
import plateledger.gui.model.RunRow;

/** The lines of the list of runs as the table asks for them. */
final class RunTableModel implements TableModel {
    private final EventListenerList listeners = new EventListenerList();
    private List<RunRow> rows = List.of();

    /** The columns, in order. */
    enum Column {
        RUN("Run", 42, "run", String.class),
        KIND("Plate or type", 130, "plate and regime of a heated run, else the type of run", String.class),
        STATE("State", 84, "what became of the run", String.class),
        SET("Set", 42, "set point; runs of one set point are repeats", String.class),
        SPEED("U, m/s", 52, "stream speed over the plate, m/s", RunRow.Cell.class),
        POWER("Q, W", 56, "electrical power, W", RunRow.Cell.class),
        NUSSELT("Nu ± U", 92, "Nusselt number of the run average, 95 % interval", RunRow.Cell.class),
        FINDINGS("Findings", 60, "findings that belong to the run", Integer.class);

        private static final List<Column> ALL = List.of(values());

        private final String title;
        private final int width;
        private final String meaning;
        private final Class<?> type;

        Column(String title, int width, String meaning, Class<?> type) {
            this.title = title;
            this.width = width;
            this.meaning = meaning;
            this.type = type;
        }

        static Column at(int index) {
            return ALL.get(index);
        }

        Object of(RunRow row) {
            return switch (this) {
                case RUN -> row.id();
                case KIND -> row.kind();
                case STATE -> row.state();
                case SET -> row.set();
                case SPEED -> row.speed();
                case POWER -> row.power();
                case NUSSELT -> row.nusselt();
                case FINDINGS -> row.findings();
            };
        }

        int width() {
            return width;
        }

        boolean number() {
            return type != String.class;
        }
    }

    void show(List<RunRow> shown) {
        rows = List.copyOf(shown);
        for (TableModelListener listener : listeners.getListeners(TableModelListener.class)) {
            listener.tableChanged(new TableModelEvent(this));
        }
    }

    RunRow row(int index) {
        return rows.get(index);
    }

    int indexOf(String runId) {
        for (int i = 0; i < rows.size(); i++) {
            if (rows.get(i).id().equals(runId)) {
                return i;
            }
        }
        return -1;
    }

    /** What is said when the pointer rests on a cell. */
    static String tip(Column column, RunRow row) {
        String levels = row.gravest().map(level -> "; gravest: " + level.word()).orElse("");
        return switch (column) {
            case STATE -> row.reason().isEmpty() ? row.state() : row.state() + ": " + row.reason();
            case FINDINGS -> row.findings() + " findings" + levels;
            case KIND -> row.type() + (row.plate().isEmpty() ? "" : ", " + row.plate());
            case SPEED -> column.meaning + ", 95 % interval: " + row.speedInterval();
            case POWER -> column.meaning + ", 95 % interval: " + row.powerInterval();
            case RUN, SET, NUSSELT -> column.meaning + ": " + column.of(row);
        };
    }

    @Override
    public int getRowCount() {
        return rows.size();
    }

    @Override
    public int getColumnCount() {
        return Column.ALL.size();
    }

    @Override
    public String getColumnName(int column) {
        return Column.at(column).title;
    }

    @Override
    public Class<?> getColumnClass(int column) {
        return Column.at(column).type;
    }

    @Override
    public boolean isCellEditable(int row, int column) {
        return false;
    }

    @Override
    public Object getValueAt(int row, int column) {
        return Column.at(column).of(rows.get(row));
    }

    @Override
    public void setValueAt(Object value, int row, int column) {
        throw new IllegalStateException("the list of runs is not edited");
    }

    @Override
    public void addTableModelListener(TableModelListener listener) {
        listeners.add(TableModelListener.class, listener);
    }

    @Override
    public void removeTableModelListener(TableModelListener listener) {
        listeners.remove(TableModelListener.class, listener);
    }
}
