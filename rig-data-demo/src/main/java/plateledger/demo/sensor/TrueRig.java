package plateledger.demo.sensor;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import plateledger.demo.physics.Air;
import plateledger.demo.physics.Panel;
import plateledger.fluid.FormulationUncertainty;

/**
 * The rig as it really is: every declared quantity drawn once.
 *
 * @param panels panels by id
 * @param exchangeFactor F of radiation
 * @param blockage relative rise of the speed over the plate
 * @param probeRecovery recovery factor of the air probe
 * @param probeRadiation radiation fraction of the air probe
 * @param pitotFactor C of U = C √(2 Δp/ρ)
 * @param anemometerFactor factor on the indicated speed
 * @param air the air's properties
 */
public record TrueRig(
        Map<String, Mounted> panels,
        double exchangeFactor,
        double blockage,
        double probeRecovery,
        double probeRadiation,
        double pitotFactor,
        double anemometerFactor,
        Air air) {

    /**
     * A panel with its sensors and heaters.
     *
     * @param panel the panel
     * @param junctions its junctions
     * @param leadOhm resistance between the sense points and the strip, per strip, Ω
     * @param stripOhm resistance of each strip, Ω
     */
    public record Mounted(Panel panel, List<Junction> junctions, double[] leadOhm, double[] stripOhm) {
        /** Copies the list. */
        public Mounted {
            junctions = List.copyOf(junctions);
        }
    }

    /**
     * A junction.
     *
     * @param channel its channel
     * @param xM place along the flow, m
     * @param declaredXM where it is declared to be, m
     * @param zM place across the flow, m
     * @param depthM below the metal's coated face, m
     * @param stem fraction of (sheet − plenum) by which it reads low
     */
    public record Junction(String channel, double xM, double declaredXM, double zM, double depthM, double stem) {}

    /** Copies the map. */
    public TrueRig {
        panels = Map.copyOf(panels);
    }

    /** Draws a rig. */
    public static TrueRig draw(Draws draws, RigDeclaration rig, Map<String, PanelDeclaration> declared) {
        Map<String, Mounted> panels = new HashMap<>();
        declared.forEach((id, panel) -> panels.put(id, mount(draws, id, panel)));
        // One state of the middle of the tests stands for all: the stated uncertainty hardly changes between them.
        FormulationUncertainty u = FormulationUncertainty.of(303.0, 98000.0, 0.01);
        Air air = new Air(
                1.0 + u.density() * draws.normal("campaign/density"),
                1.0 + u.viscosity() * draws.normal("campaign/viscosity"),
                1.0 + u.conductivity() * draws.normal("campaign/conductivity"),
                1.0 + u.heatCapacity() * draws.normal("campaign/heat capacity"));
        return new TrueRig(
                panels,
                rig.exchangeFactor().draw(draws, "rig/exchange factor"),
                rig.blockage().draw(draws, "rig/blockage"),
                rig.probeRecovery().draw(draws, "rig/probe recovery"),
                rig.probeRadiation().draw(draws, "rig/probe radiation"),
                rig.pitotFactor().draw(draws, "rig/pitot factor"),
                rig.anemometerFactor().draw(draws, "rig/anemometer factor"),
                air);
    }

    /** The panel of that id. */
    public Mounted mounted(String id) {
        Mounted mounted = panels.get(id);
        if (mounted == null) {
            throw new IllegalArgumentException("no panel " + id);
        }
        return mounted;
    }

    private static Mounted mount(Draws draws, String id, PanelDeclaration d) {
        String scope = "panel:" + id + "/";
        int strips = d.strips().size();
        double[] edges = new double[strips + 1];
        double[] lead = new double[strips];
        double[] ohm = new double[strips];
        for (int s = 0; s < strips; s++) {
            edges[s] = d.strips().get(s).fromMm() * 1e-3;
            lead[s] = d.leadResistance().draw(draws, scope + "lead " + s);
            // Not declared: the strips' own resistance, 8 Ω within 1 %.
            ohm[s] = 8.0 * (1.0 + 0.01 * draws.even(scope + "strip " + s));
        }
        edges[0] = d.heatedStart().draw(draws, scope + "heated start");
        edges[strips] = d.heatedEnd().draw(draws, scope + "heated end");
        double coat = d.coatThickness().draw(draws, scope + "coat thickness")
                / d.coatConductivity().draw(draws, scope + "coat conductivity");
        Panel panel = new Panel(
                edges,
                d.width().draw(draws, scope + "width"),
                d.sheetThickness().draw(draws, scope + "sheet thickness"),
                d.sheetConductivity().draw(draws, scope + "sheet conductivity"),
                d.sheetCapacity().draw(draws, scope + "sheet capacity"),
                coat,
                d.emissivity().draw(draws, scope + "emissivity"),
                d.back().draw(draws, scope + "back"),
                d.foamThickness().draw(draws, scope + "foam thickness")
                        * d.foamCapacity().draw(draws, scope + "foam capacity"),
                d.edge().draw(draws, scope + "edge"),
                d.nose().draw(draws, scope + "nose"),
                d.tail().draw(draws, scope + "tail"),
                d.cover().draw(draws, scope + "cover"));
        List<Junction> junctions = new ArrayList<>();
        for (PanelDeclaration.Junction j : d.junctions()) {
            String own = scope + j.channel() + " ";
            junctions.add(new Junction(
                    j.channel(),
                    j.x().draw(draws, own + "x"),
                    j.x().si(),
                    j.zMm() * 1e-3,
                    d.depth().draw(draws, own + "depth"),
                    d.stemFraction().draw(draws, own + "stem")));
        }
        return new Mounted(panel, junctions, lead, ohm);
    }
}
