package plateledger.demo.app;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNotEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import java.util.Map;
import java.util.stream.Collectors;
import net.jqwik.api.ForAll;
import net.jqwik.api.Property;
import net.jqwik.api.constraints.LongRange;
import org.junit.jupiter.api.Test;
import plateledger.demo.app.RunPlan.Flow;
import plateledger.demo.app.RunPlan.Kind;
import plateledger.demo.physics.HeatBooks;
import plateledger.demo.physics.PlateGrid;
import plateledger.demo.sensor.Channels;

/** Laws that the simulated campaign must keep whatever rig is drawn. */
final class SimulatedCampaignTest {
    private static final SimulatedCampaign CAMPAIGNS = new SimulatedCampaign();

    /** Where the heat went must add up to what was put in: far below a millionth of the power. */
    @Property(tries = 10)
    void booksClose(@ForAll @LongRange(min = 0, max = 1_000_000) long seed) {
        for (RunMeans run : CAMPAIGNS.means(seed, Options.full())) {
            double scale = Math.max(0.1, run.truth().books().electrical());
            assertEquals(0.0, run.truth().books().residual(), 1e-6 * scale, run.runId());
        }
    }

    /** The product's true points lie on its law: C Re^m Pr^(1/3) with film properties. */
    @Property(tries = 5)
    void productObeysItsLaw(@ForAll @LongRange(min = 0, max = 1_000_000) long seed) {
        ProductLaw law = ProductLaw.straight();
        int runs = 0;
        for (RunMeans run : CAMPAIGNS.means(seed, Options.product())) {
            if (run.plan().kind() == Kind.HEATED) {
                RunTruth t = run.truth();
                double expected = law.c() * Math.pow(t.reynolds(), law.m()) * Math.cbrt(t.prandtl());
                assertEquals(expected, t.nusselt(), 2e-6 * expected, run.runId());
                runs++;
            }
        }
        assertEquals(16, runs);
    }

    @Test
    void bentLawBendsByTwoPercent() {
        ProductLaw bent = ProductLaw.straight().bent(0.02);
        ProductLaw straight = ProductLaw.straight();
        double middle = Math.log(bent.nusselt(1.93e5, 0.71) / straight.nusselt(1.93e5, 0.71));
        double end = Math.log(
                bent.nusselt(1.93e5 * Math.sqrt(10.0), 0.71) / straight.nusselt(1.93e5 * Math.sqrt(10.0), 0.71));
        assertEquals(0.02, end - middle, 1e-12);
    }

    /** Shared errors are drawn once per group: the same in every run, another in another campaign, none without errors. */
    @Test
    void errorsBelongToTheirGroups() {
        RunMeans drawn = run(CAMPAIGNS.means(7, Options.product()), "P05");
        RunMeans again = run(CAMPAIGNS.means(7, Options.product()), "P05");
        RunMeans other = run(CAMPAIGNS.means(8, Options.product()), "P05");
        assertEquals(drawn.mean(), again.mean());
        assertNotEquals(drawn.mean(), other.mean());
        assertEquals(run(CAMPAIGNS.means(7, Options.full()), "P05").mean(), drawn.mean());
    }

    /** A run driven in time ends where the window means stand: transient and steady model are one physics. */
    @Test
    void timeAndSteadyMeansAgree() {
        Options exact = Options.full().withoutErrors();
        List<RunMeans> means = CAMPAIGNS.means(1, exact);
        for (String id : List.of("B07", "B15", "P13", "PL1")) {
            RunMeans run = run(means, id);
            RunHistory history = CAMPAIGNS.history(1, exact, id);
            double middle = run.plan().durationS() - 0.5 * run.windowS();
            for (String channel : Channels.JUNCTIONS) {
                double inTime = history.value(history.channels().indexOf(channel), middle);
                // The deep foam is still warming by some millikelvin where a run is short.
                assertEquals(run.mean().getOrDefault(channel, Double.NaN), inTime, 0.09, id + " " + channel);
            }
            double at = run.plan().startS() + middle;
            HeatBooks books = history.truth(at - 30.0, at + 30.0).books();
            double power = books.electrical();
            // What does not go into storage; a short run's foam still takes some thousandths of the power.
            double steady =
                    run.truth().books().electrical() - run.truth().books().storage();
            // The two paths also use grids of their own, which differ by up to two thousandths in a loss run (test
            // below).
            double share = run.plan().kind() == Kind.LOSS ? 0.002 : 0.005;
            assertEquals(steady, power - books.storage(), share * power, id);
            assertEquals(0.0, history.truth().books().residual(), 1e-6 * power, id);
        }
    }

    /** Halving the cells moves no result by more than a small part of what the instruments resolve. */
    @Test
    void gridsAreFineEnough() {
        Options exact = Options.full().withoutErrors();
        for (String id : List.of("B01", "B07", "B09", "B15", "P01", "P13", "BL3")) {
            RunTruth fast = truth(exact, id, PlateGrid.Fineness.FAST);
            RunTruth normal = truth(exact, id, PlateGrid.Fineness.NORMAL);
            RunTruth fine = truth(exact, id, PlateGrid.Fineness.FINE);
            double power = fine.books().electrical();
            assertEquals(power, normal.books().electrical(), 1e-3 * power, id);
            assertEquals(power, fast.books().electrical(), 2e-3 * power, id);
            assertEquals(fine.books().convection(), normal.books().convection(), 1e-4 * power, id);
            assertEquals(fine.books().convection(), fast.books().convection(), 2e-4 * power, id);
            if (!fine.stations().isEmpty()) {
                assertEquals(fine.nusselt(), normal.nusselt(), 2e-4 * fine.nusselt(), id);
                assertEquals(fine.nusselt(), fast.nusselt(), 4e-4 * fine.nusselt(), id);
                for (int s = 0; s < fine.stations().size(); s++) {
                    double t = fine.stations().get(s).faceK();
                    assertEquals(t, normal.stations().get(s).faceK(), 0.005, id + " station " + s);
                    assertEquals(t, fast.stations().get(s).faceK(), 0.012, id + " station " + s);
                }
            }
        }
    }

    private static RunTruth truth(Options options, String id, PlateGrid.Fineness fineness) {
        return CAMPAIGNS.steadyTruth(1, options, id, fineness);
    }

    /** The campaign asked for: types, numbers and repeats of the runs, temperatures near what was planned. */
    @Test
    void scheduleIsTheOnePlanned() {
        List<RunMeans> runs = CAMPAIGNS.means(1, Options.full().withoutErrors());
        Map<String, Long> kinds = runs.stream()
                .collect(Collectors.groupingBy(
                        r -> r.plan().panel() + " " + r.plan().kind() + " "
                                + r.plan().flow(),
                        Collectors.counting()));
        assertEquals(8, kinds.get("baseline HEATED LAMINAR"));
        assertEquals(8, kinds.get("baseline HEATED TRIPPED"));
        assertEquals(16, kinds.get("product HEATED PRODUCT"));
        assertEquals(3, kinds.get("product LOSS PRODUCT"));
        assertEquals(44, runs.size());
        double last = 0.0;
        for (RunMeans run : runs) {
            RunPlan plan = run.plan();
            assertTrue(plan.startS() >= last, plan.id() + " starts after the run before has ended");
            last = plan.startS() + plan.durationS();
            if (plan.kind() == Kind.HEATED) {
                double rise = run.truth().meanFaceK() - run.truth().streamK();
                assertTrue(rise > 15.0 && rise < 25.0, plan.id() + " rises by " + rise + " K");
            }
            if (plan.flow() == Flow.PRODUCT && plan.kind() == Kind.HEATED) {
                double h = run.truth().coefficient();
                assertTrue(h > 10.0 && h < 90.0, plan.id() + " has h " + h);
            }
        }
    }

    private static RunMeans run(List<RunMeans> runs, String id) {
        return runs.stream().filter(r -> r.runId().equals(id)).findFirst().orElseThrow();
    }
}
