package plateledger.gui.app;

import java.awt.Toolkit;
import java.awt.event.InputEvent;
import java.awt.event.KeyEvent;
import java.util.function.Consumer;
import javax.swing.ButtonGroup;
import javax.swing.JMenu;
import javax.swing.JMenuBar;
import javax.swing.JMenuItem;
import javax.swing.JRadioButtonMenuItem;
import javax.swing.KeyStroke;
import plateledger.gui.model.WindowState;

/** The menus; each item has a mnemonic, the frequent ones a key. */
final class Menus {
    private final JMenuBar bar = new JMenuBar();
    private final JMenuItem again;
    private final JMenuItem stop;

    /** What the menus can do. */
    interface Actions {
        void open();

        void reduceAgain();

        void stop();

        void quit();

        void copyPlateChart();

        void copyNuReChart();

        void about();
    }

    Menus(Actions actions, Appearance appearance, Consumer<Appearance> onAppearance) {
        int menuKey = java.awt.GraphicsEnvironment.isHeadless()
                ? InputEvent.CTRL_DOWN_MASK
                : Toolkit.getDefaultToolkit().getMenuShortcutKeyMaskEx();
        JMenu campaign = menu("Campaign", 'C');
        item(campaign, "Open…", 'O', KeyStroke.getKeyStroke(KeyEvent.VK_O, menuKey), actions::open);
        again = item(campaign, "Reduce again", 'R', KeyStroke.getKeyStroke(KeyEvent.VK_F5, 0), actions::reduceAgain);
        stop = item(
                campaign,
                "Cancel the reduction",
                'L',
                KeyStroke.getKeyStroke(KeyEvent.VK_PERIOD, menuKey),
                actions::stop);
        campaign.addSeparator();
        item(campaign, "Quit", 'Q', KeyStroke.getKeyStroke(KeyEvent.VK_Q, menuKey), actions::quit);

        JMenu charts = menu("Charts", 'H');
        item(
                charts,
                "Copy the plate chart as picture",
                'P',
                KeyStroke.getKeyStroke(KeyEvent.VK_1, menuKey | InputEvent.SHIFT_DOWN_MASK),
                actions::copyPlateChart);
        item(
                charts,
                "Copy the Nu over Re chart as picture",
                'N',
                KeyStroke.getKeyStroke(KeyEvent.VK_2, menuKey | InputEvent.SHIFT_DOWN_MASK),
                actions::copyNuReChart);

        JMenu view = menu("View", 'V');
        ButtonGroup group = new ButtonGroup();
        appearance(view, group, "Light", 'L', Appearance.LIGHT, appearance, onAppearance);
        appearance(view, group, "Dark", 'D', Appearance.DARK, appearance, onAppearance);

        JMenu help = menu("Help", 'E');
        JMenuItem about = new JMenuItem("About plateledger", 'A');
        about.addActionListener(event -> actions.about());
        help.add(about);
    }

    JMenuBar bar() {
        return bar;
    }

    /** Enables what can be done in a state. */
    void render(WindowState state) {
        again.setEnabled(state.canReduceAgain());
        stop.setEnabled(state.canStop());
    }

    private JMenu menu(String text, char mnemonic) {
        JMenu menu = new JMenu(text);
        menu.setName("menu " + text);
        menu.setMnemonic(mnemonic);
        bar.add(menu);
        return menu;
    }

    private static JMenuItem item(JMenu menu, String text, char mnemonic, KeyStroke key, Runnable action) {
        JMenuItem item = new JMenuItem(text, mnemonic);
        item.setName("item " + text);
        item.setAccelerator(key);
        item.addActionListener(event -> action.run());
        menu.add(item);
        return item;
    }

    private static void appearance(
            JMenu menu,
            ButtonGroup group,
            String text,
            char mnemonic,
            Appearance value,
            Appearance now,
            Consumer<Appearance> onAppearance) {
        JRadioButtonMenuItem item = new JRadioButtonMenuItem(text, value == now);
        item.setName("item " + text);
        item.setMnemonic(mnemonic);
        item.addActionListener(event -> onAppearance.accept(value));
        group.add(item);
        menu.add(item);
    }
}
