package plateledger.demo.app;

import java.util.ArrayList;
import java.util.List;
import java.util.function.ToDoubleFunction;
import plateledger.demo.physics.HeatBooks;

/**
 * What was true in a run, averaged over a window; by the campaign's definitions. Dimensionless numbers are NaN where
 * nothing is heated in a stream.
 *
 * @param fromS start of the window, s since 1970-01-01T00:00Z
 * @param toS its end
 * @param speedMPerS speed over the plate, m/s
 * @param streamK T_∞
 * @param adiabaticK T_∞ + r U²/2c_p
 * @param meanFaceK area mean of T_s
 * @param coefficient ∫q_conv dA ÷ ∫(T_s − T_aw) dA, W/(m² K)
 * @param reynolds Re_L
 * @param nusselt Nu_L
 * @param prandtl Pr
 * @param books where the heat went
 * @param leadW lost between the sense points and the strips
 * @param stations centre-line junctions
 */
public record RunTruth(
        double fromS,
        double toS,
        double speedMPerS,
        double streamK,
        double adiabaticK,
        double meanFaceK,
        double coefficient,
        double reynolds,
        double nusselt,
        double prandtl,
        HeatBooks books,
        double leadW,
        List<StationTruth> stations) {
    /** Copies the list. */
    public RunTruth {
        stations = List.copyOf(stations);
    }

    /** The average of successive instants. */
    static RunTruth mean(List<RunTruth> parts) {
        RunTruth first = parts.get(0);
        List<StationTruth> stations = new ArrayList<>();
        for (int i = 0; i < first.stations.size(); i++) {
            int at = i;
            StationTruth s = first.stations.get(i);
            stations.add(new StationTruth(
                    s.channel(),
                    s.xM(),
                    mean(parts, p -> p.stations.get(at).faceK()),
                    mean(parts, p -> p.stations.get(at).convectionWPerM2()),
                    mean(parts, p -> p.stations.get(at).coefficient()),
                    mean(parts, p -> p.stations.get(at).reynolds()),
                    mean(parts, p -> p.stations.get(at).nusselt()),
                    mean(parts, p -> p.stations.get(at).prandtl())));
        }
        return new RunTruth(
                first.fromS,
                parts.get(parts.size() - 1).toS,
                mean(parts, RunTruth::speedMPerS),
                mean(parts, RunTruth::streamK),
                mean(parts, RunTruth::adiabaticK),
                mean(parts, RunTruth::meanFaceK),
                mean(parts, RunTruth::coefficient),
                mean(parts, RunTruth::reynolds),
                mean(parts, RunTruth::nusselt),
                mean(parts, RunTruth::prandtl),
                new HeatBooks(
                        mean(parts, p -> p.books.electrical()),
                        mean(parts, p -> p.books.convection()),
                        mean(parts, p -> p.books.radiation()),
                        mean(parts, p -> p.books.cover()),
                        mean(parts, p -> p.books.back()),
                        mean(parts, p -> p.books.edge()),
                        mean(parts, p -> p.books.nose()),
                        mean(parts, p -> p.books.tail()),
                        mean(parts, p -> p.books.storage())),
                mean(parts, RunTruth::leadW),
                stations);
    }

    private static double mean(List<RunTruth> parts, ToDoubleFunction<RunTruth> of) {
        return parts.stream().mapToDouble(of).average().orElse(Double.NaN);
    }
}
