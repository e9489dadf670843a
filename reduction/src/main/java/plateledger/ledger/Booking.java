package plateledger.ledger;

import plateledger.ledger.RunLayout.In;
import plateledger.ledger.RunLayout.Out;
import plateledger.ledger.RunLayout.StationOut;

/** Books one solved state of the sheet: totals over the span, averages, stations, theory. METHODS.md, The heat ledger. */
final class Booking {
    private final RunModel model;
    private final RunLayout layout;
    private final PlateGrid grid;
    private final double[] in;
    private final double[] out;
    private final Stream stream;
    private final double reference;
    private final PlateState s;
    private final SheetInputs sheet;
    private final double airK;
    private final double[] misfit;

    Booking(RunModel model, double[] in, double[] out, Stream stream, double reference, PlateState state) {
        this.model = model;
        this.layout = model.layout;
        this.grid = model.grid;
        this.in = in;
        this.out = out;
        this.stream = stream;
        this.reference = reference;
        this.s = state;
        sheet = new SheetInputs(in, layout, grid);
        airK = get(In.AIR_TEMPERATURE);
        misfit = misfitAlong();
    }

    private double get(In input) {
        return in[layout.at(input)];
    }

    private void put(Out output, double value) {
        out[layout.at(output)] = value;
    }

    private void put(int station, StationOut output, double value) {
        out[layout.at(station, output)] = value;
    }

    private boolean used(int junction) {
        return Double.isFinite(model.setting.sigmaK()[junction]);
    }

    void write() {
        double film = averages(totals());
        double[] flux = new double[grid.cells];
        for (int i = 0; i < grid.cells; i++) {
            flux[i] = s.h[i] * (s.surfaceK[i] - reference);
        }
        double[] wall = model.theory.wallDifference(in, stream, film, flux);
        theoryAverage(flux, wall);
        for (int j = 0; j < model.stationJunction.length; j++) {
            if (used(model.stationJunction[j])) {
                station(j, model.stationJunction[j], flux, wall);
            }
        }
        put(Out.SPEED, get(In.SPEED));
        put(Out.AIR_TEMPERATURE, airK);
        put(Out.PRESSURE, get(In.PRESSURE));
        put(Out.VAPOUR_FRACTION, get(In.VAPOUR_FRACTION));
    }

    /** Reading − model of the stations carried along the plate, in each cell, K. */
    private double[] misfitAlong() {
        double sum = 0.0;
        int count = 0;
        for (int p = 0; p < layout.junctions(); p++) {
            if (used(p)) {
                double miss = in[layout.reading(p)] - s.junctionK[p];
                sum += miss * miss;
                count++;
            }
        }
        put(Out.MISFIT, Math.sqrt(sum / count));
        double[] x = new double[model.stationJunction.length];
        double[] miss = new double[x.length];
        int m = 0;
        for (int p : model.stationJunction) {
            if (used(p)) {
                x[m] = in[layout.place(p)];
                miss[m++] = in[layout.reading(p)] - s.junctionK[p];
            }
        }
        double[] along = new double[grid.cells];
        for (int i = 0; i < grid.cells; i++) {
            along[i] = carried(x, miss, m, sheet.onPlate(grid.centres[i]));
        }
        return along;
    }

    /** Straight lines between stations, constant beyond the outer ones. */
    private static double carried(double[] x, double[] miss, int m, double at) {
        if (m < 2) {
            return m == 0 ? 0.0 : miss[0];
        }
        int j = 0;
        while (j < m - 2 && x[j + 1] < at) {
            j++;
        }
        double w = Math.min(1.0, Math.max(0.0, (at - x[j]) / (x[j + 1] - x[j])));
        return miss[j] + w * (miss[j + 1] - miss[j]);
    }

    /** Sums over the heated area. */
    private static final class Totals {
        private double convection;
        private double radiation;
        private double back;
        private double edge;
        private double storage;
        /** ∫ (T_s − T_ref) dA, K m². */
        private double difference;
        /** ∫ h dA, W/K. */
        private double conductance;

        private double area;
    }

    private Totals totals() {
        Totals t = new Totals();
        for (int i = 0; i < grid.cells; i++) {
            addCell(t, i);
        }
        double electrical = 0.0;
        double lead = 0.0;
        for (int j = 0; j < layout.strips(); j++) {
            electrical += in[layout.power(j)];
            lead += in[layout.lead(j)];
        }
        double nose = endRate(0, s.endUpK, sheet.noseWPerK, sheet.noseK);
        double tail = endRate(grid.cells - 1, s.endDownK, sheet.tailWPerK, sheet.tailK);
        put(Out.Q_ELECTRICAL, electrical);
        put(Out.Q_CONVECTION, t.convection);
        put(Out.Q_RADIATION, t.radiation);
        put(Out.Q_BACK, t.back);
        put(Out.Q_EDGE, t.edge);
        put(Out.Q_NOSE, nose);
        put(Out.Q_TAIL, tail);
        put(Out.Q_GUARD, 0.0);
        put(Out.Q_LEAD, lead);
        put(Out.Q_STORAGE, t.storage);
        put(Out.Q_RESIDUAL, electrical - t.convection - t.radiation - t.back - t.edge - nose - tail - lead - t.storage);
        return t;
    }

    /**
     * Adds one cell over the whole span. Convection is that of the fitted model; radiation and back are booked at the
     * readings, so that the remainder tells by how many watts the model misses the junctions.
     */
    private void addCell(Totals t, int i) {
        double l = conductionLength(i);
        double drop = SpanProfile.edgeShare(sheet.edgeWPerMK, sheet.sheetWPerK, l, sheet.widthM)
                * (s.sheetK[i] - sheet.frameK);
        double meanDrop = drop * SpanProfile.meanShape(l, sheet.widthM);
        double facePerSheet = 1.0 - s.surfaceSlope[i] * sheet.faceM2KPerW;
        double faceDrop = meanDrop * facePerSheet;
        double meanSquare = drop * drop * SpanProfile.meanSquareShape(l, sheet.widthM) * facePerSheet * facePerSheet;
        double ts = s.surfaceK[i];
        double slope = LossTerm.Radiation.slope(sheet.exchange, sheet.emissivity, ts);
        double curvature = 1.5 * slope / ts * meanSquare; // ½ d²(T⁴)/dT² of the span's spread
        double cell = sheet.dx[i] * sheet.widthM;
        t.area += cell;
        t.conductance += cell * s.h[i];
        t.difference += cell * (ts - faceDrop - reference);
        t.convection += cell * s.h[i] * (ts - faceDrop - reference);
        t.radiation += cell
                * (LossTerm.Radiation.flux(sheet.exchange, sheet.emissivity, ts, sheet.wallK)
                        - slope * (faceDrop - misfit[i] * facePerSheet)
                        + curvature);
        t.back += cell * LossTerm.Back.flux(sheet.backWPerM2K, s.sheetK[i] - meanDrop + misfit[i], sheet.plenumK);
        t.edge += sheet.dx[i] * LossTerm.Edge.rateWPerM(sheet.edgeWPerMK, s.sheetK[i] - drop, sheet.frameK);
        t.storage += cell
                * (sheet.store
                        + LossTerm.Back.flux(sheet.soakWPerM2K, s.sheetK[i] - meanDrop + misfit[i], sheet.plenumK));
    }

    private double conductionLength(int cell) {
        return SpanProfile.length(sheet.sheetWPerK, s.surfaceSlope[cell] + sheet.behindWPerM2K);
    }

    /** Rate out of an end of the sheet, at the span's mean temperature there, W. */
    private double endRate(int cell, double endK, double conductanceWPerK, double neighbourK) {
        double l = conductionLength(cell);
        double share = SpanProfile.edgeShare(sheet.edgeWPerMK, sheet.sheetWPerK, l, sheet.widthM)
                * SpanProfile.meanShape(l, sheet.widthM);
        return LossTerm.EndConduction.rateW(conductanceWPerK, endK - share * (endK - sheet.frameK), neighbourK);
    }

    /** Dimensionless averages, METHODS.md eqs. (D-2) to (D-5); returns their property temperature, K. */
    private double averages(Totals t) {
        double meanSurface = reference + t.difference / t.area;
        double film = propertyTemperature(meanSurface);
        double end = get(In.HEATED_END);
        double length = model.setting.fromLeadingEdge() ? end : end - sheet.startM;
        double k = stream.conductivity(film);
        double meanH = t.conductance / t.area;
        double h = model.setting.fluxOverDifference() ? t.convection / t.difference : meanH;
        put(Out.RE_L, get(In.SPEED) * length / stream.kinematicViscosity(film));
        put(Out.NU_L, h * length / k);
        put(Out.NU_L_MEAN_H, meanH * length / k);
        put(Out.PR, stream.prandtl(film));
        put(Out.H, h);
        put(Out.MEAN_SURFACE, meanSurface);
        return film;
    }

    private double propertyTemperature(double surfaceK) {
        return model.setting.filmProperties() ? 0.5 * (surfaceK + airK) : airK;
    }

    /** Measured over theory by the campaign's average, on the centre line, where both stand side by side. */
    private void theoryAverage(double[] flux, double[] wall) {
        double q = 0.0;
        double measured = 0.0;
        double expected = 0.0;
        double measuredH = 0.0;
        double expectedH = 0.0;
        for (int i = 0; i < grid.cells; i++) {
            q += sheet.dx[i] * flux[i];
            measured += sheet.dx[i] * (s.surfaceK[i] - reference);
            expected += sheet.dx[i] * wall[i];
            measuredH += sheet.dx[i] * s.h[i];
            expectedH += sheet.dx[i] * flux[i] / wall[i];
        }
        double ratio = model.setting.fluxOverDifference() ? expected / measured : measuredH / expectedH;
        put(Out.NU_L_THEORY, out[layout.at(Out.NU_L)] / ratio);
        put(Out.LN_RATIO, q > 0.0 ? Math.log(ratio) : Double.NaN);
    }

    private void station(int j, int p, double[] flux, double[] wall) {
        double x = in[layout.place(p)];
        double gx = sheet.onGrid(x);
        int c = grid.stencil(gx);
        double ts = Lagrange.value(grid.centres, s.surfaceK, c, gx);
        double metal = Lagrange.value(grid.centres, s.sheetK, c, gx);
        double q = Lagrange.value(grid.centres, flux, c, gx);
        double h = q / (ts - reference);
        double radiation = LossTerm.Radiation.flux(sheet.exchange, sheet.emissivity, ts, sheet.wallK);
        double back = LossTerm.Back.flux(sheet.backWPerM2K, metal, sheet.plenumK);
        double electrical = sheet.qe[c + 1];
        double stored = sheet.store + LossTerm.Back.flux(sheet.soakWPerM2K, metal, sheet.plenumK);
        double conduction = electrical - q - radiation - back - stored;
        double film = propertyTemperature(ts);
        double k = stream.conductivity(film);
        double re = get(In.SPEED) * x / stream.kinematicViscosity(film);
        double pr = stream.prandtl(film);
        put(j, StationOut.X, x);
        put(j, StationOut.SURFACE, ts);
        put(j, StationOut.REFERENCE, reference);
        put(j, StationOut.FILM, film);
        put(j, StationOut.Q_ELECTRICAL, electrical);
        put(j, StationOut.Q_RADIATION, radiation);
        put(j, StationOut.Q_BACK, back);
        put(j, StationOut.Q_CONDUCTION, conduction);
        put(j, StationOut.Q_CONVECTION, q);
        put(j, StationOut.Q_CONVECTION_LOCAL, localBalance(j, electrical, radiation, back + stored));
        put(j, StationOut.H, h);
        put(j, StationOut.RE_X, re);
        put(j, StationOut.NU_X, h * x / k);
        put(j, StationOut.PR, pr);
        put(j, StationOut.RELIANCE, Math.abs(conduction) / electrical);
        double expected = q / Lagrange.value(grid.centres, wall, c, gx);
        double textbook = model.theory.textbook(re, pr);
        put(j, StationOut.NU_X_THEORY, expected * x / k);
        put(j, StationOut.NU_X_TEXTBOOK, textbook);
        put(j, StationOut.LN_RATIO, Math.log(h / expected));
        put(j, StationOut.H_EQUIVALENT, h * textbook / (expected * x / k));
    }

    /** q from the readings alone: electrical less booked losses and the three-point difference of neighbours. */
    private double localBalance(int j, double electrical, double radiation, double behind) {
        int last = model.stationJunction.length - 1;
        if (j == 0 || j == last || !used(model.stationJunction[j - 1]) || !used(model.stationJunction[j + 1])) {
            return Double.NaN;
        }
        int a = model.stationJunction[j - 1];
        int b = model.stationJunction[j];
        int c = model.stationJunction[j + 1];
        double xa = in[layout.place(a)];
        double xb = in[layout.place(b)];
        double xc = in[layout.place(c)];
        double left = (in[layout.reading(b)] - in[layout.reading(a)]) / (xb - xa);
        double right = (in[layout.reading(c)] - in[layout.reading(b)]) / (xc - xb);
        double bend = (right - left) / (0.5 * (xc - xa));
        return electrical - radiation - behind + sheet.sheetWPerK * bend;
    }
}
