package plateledger.gui.view;

import java.awt.Font;
import java.nio.file.Path;
import java.util.Optional;
import javax.swing.Icon;
import javax.swing.JButton;
import javax.swing.JComponent;
import javax.swing.JLabel;
import javax.swing.JPanel;
import net.miginfocom.swing.MigLayout;

/** What is shown before a campaign is open. */
public final class StartPanel {
    private final JPanel root = new JPanel(new MigLayout("fill, wrap 1, ins 40", "[center]", "push[][][][][]push"));

    /** The panel, with the campaign that was open last if there is one. */
    public StartPanel(Gestures gestures, Icon icon, Optional<Path> last) {
        JLabel name = new JLabel("plateledger");
        name.setFont(name.getFont().deriveFont(Font.BOLD, name.getFont().getSize2D() * 1.8f));
        JButton open = new JButton("Open a campaign folder…");
        open.setName("open campaign");
        open.setMnemonic('O');
        open.addActionListener(event -> gestures.open());
        root.add(new JLabel(icon));
        root.add(name);
        root.add(open, "gaptop 12");
        last.ifPresent(folder -> {
            JButton again = new JButton("Open again: " + folder);
            again.setName("open last campaign");
            again.setMnemonic('A');
            again.addActionListener(event -> gestures.openLast());
            root.add(again, "wmax 90%");
        });
        root.add(new JLabel(
                "or drop the folder here. A campaign folder holds campaign.toml, rig.toml, instruments.toml."));
    }

    /** The component to lay out. */
    public JComponent component() {
        return root;
    }
}
