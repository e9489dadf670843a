package plateledger.fit;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertNotEquals;

import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import plateledger.validation.ValidationRecorder;

final class BothAxesLineTest {
    /** Pearson's points (Phil. Mag. 2 (1901) 559) with York's weights (Can. J. Phys. 44 (1966) 1079). */
    private static final double[] X = {0.0, 0.9, 1.8, 2.6, 3.3, 4.4, 5.2, 6.1, 6.5, 7.4};

    private static final double[] Y = {5.9, 5.4, 4.4, 4.6, 3.5, 3.7, 2.8, 2.8, 2.4, 1.5};
    private static final double[] WX = {1000.0, 1000.0, 500.0, 800.0, 200.0, 80.0, 60.0, 20.0, 1.8, 1.0};
    private static final double[] WY = {1.0, 1.8, 4.0, 8.0, 20.0, 20.0, 70.0, 70.0, 100.0, 500.0};

    private static BothAxesLine pearsonYork(double r) {
        double[] varX = new double[X.length];
        double[] varY = new double[X.length];
        double[] cov = new double[X.length];
        for (int i = 0; i < X.length; i++) {
            varX[i] = 1.0 / WX[i];
            varY[i] = 1.0 / WY[i];
            cov[i] = r * Math.sqrt(varX[i] * varY[i]);
        }
        return BothAxesLine.fit(X, Y, new RandomParts(varX, varY, cov), 0.0).orElseThrow();
    }

    /** a, b as printed for these data since Williamson, Can. J. Phys. 46 (1968) 1845; u at adjusted points as York 2004. */
    @Test
    @Tag("validation")
    void pearsonDataWithYorkWeights() {
        try (ValidationRecorder check = ValidationRecorder.of(
                getClass(),
                "Fit",
                "Pearson data with York weights",
                "Williamson, Can. J. Phys. 46 (1968) 1845; u as York et al., Am. J. Phys. 72 (2004) 367")) {
            BothAxesLine line = pearsonYork(0.0);
            check.relative(5.479910224033, line.a(), 1e-12, "line.a()");
            check.relative(-0.480533407446, line.b(), 2e-11, "line.b()");
            check.relative(0.294970735, Math.sqrt(line.varA()), 2e-9, "sqrt(line.varA())");
            check.relative(0.057985009, Math.sqrt(line.varB()), 9e-9, "sqrt(line.varB())");
            check.relative(-0.0164725447, line.covAB(), 4e-9, "line.covAB()");
            check.relative(1.48329414926, line.chiSquare() / 8.0, 4e-12, "line.chiSquare()/8.0");
        }
    }

    /** The same points with a constant correlation; computed by two routes in SciPy 1.10, apart from this program. */
    @Test
    @Tag("validation")
    void pearsonDataWithCorrelatedErrors() {
        try (ValidationRecorder check = ValidationRecorder.of(
                getClass(), "Fit", "Pearson data with correlated errors", "computed by two routes in SciPy")) {
            BothAxesLine plus = pearsonYork(0.5);
            check.relative(5.534374564, plus.a(), 1e-9, "plus.a()");
            check.relative(-0.492880617, plus.b(), 2e-8, "plus.b()");
            check.relative(0.313418027, Math.sqrt(plus.varA()), 2e-8, "sqrt(plus.varA())");
            check.relative(0.062973980, Math.sqrt(plus.varB()), 8e-8, "sqrt(plus.varB())");
            check.relative(9.570265132, plus.chiSquare(), 6e-10, "plus.chiSquare()");
            BothAxesLine minus = pearsonYork(-0.5);
            check.relative(5.358788127, minus.a(), 1e-9, "minus.a()");
            check.relative(-0.454006480, minus.b(), 2e-8, "minus.b()");
            check.relative(0.268081370, Math.sqrt(minus.varA()), 2e-8, "sqrt(minus.varA())");
            check.relative(0.050874253, Math.sqrt(minus.varB()), 1e-7, "sqrt(minus.varB())");
            check.relative(16.533951625, minus.chiSquare(), 4e-10, "minus.chiSquare()");
        }
    }

    /** ISO/TS 28037:2010, example with uncertainties in both coordinates; printed 0.5788, 2.1597, 0.4764, 0.1355, −0.0577, 2.743. */
    @Test
    @Tag("validation")
    void straightLineOfIso28037() {
        try (ValidationRecorder check = ValidationRecorder.of(
                getClass(),
                "Fit",
                "straight line with errors in both axes",
                "ISO/TS 28037:2010, as printed; digits computed in SciPy")) {
            double[] x = {1.2, 1.9, 2.9, 4.0, 4.7, 5.9};
            double[] y = {3.4, 4.4, 7.2, 8.5, 10.8, 13.5};
            double[] varX = {0.04, 0.04, 0.04, 0.04, 0.04, 0.04};
            double[] varY = {0.04, 0.04, 0.04, 0.16, 0.16, 0.16};
            BothAxesLine line = BothAxesLine.fit(x, y, new RandomParts(varX, varY, new double[6]), 0.0)
                    .orElseThrow();
            check.relative(0.5788, line.a(), 9e-5, "line.a()");
            check.relative(2.1597, line.b(), 3e-5, "line.b()");
            check.relative(0.4764, Math.sqrt(line.varA()), 2e-4, "sqrt(line.varA())");
            check.relative(0.1355, Math.sqrt(line.varB()), 4e-4, "sqrt(line.varB())");
            check.relative(-0.0577, line.covAB(), 9e-4, "line.covAB()");
            check.relative(2.743, line.chiSquare(), 2e-4, "line.chiSquare()");
            check.relative(0.5788221221, line.a(), 2e-8, "line.a()"); // computed in SciPy 1.10, as are those below
            check.relative(2.1596565674, line.b(), 5e-9, "line.b()");
            check.relative(0.4764206296, Math.sqrt(line.varA()), 3e-8, "sqrt(line.varA())");
            check.relative(0.1355479275, Math.sqrt(line.varB()), 8e-8, "sqrt(line.varB())");
        }
    }

    /**
     * Equal errors in both axes: the closed form of the orthogonal line (Pearson 1901), slope
     * [s_yy − s_xx + √((s_yy − s_xx)² + 4 s_xy²)]/(2 s_xy). With weights frozen at the slope before, all weights are equal
     * and every round gives ordinary least squares, which is flatter.
     */
    @Test
    void frozenWeightsWouldCollapseToOrdinaryLeastSquares() {
        double[] var = new double[X.length];
        java.util.Arrays.fill(var, 0.25);
        double b = BothAxesLine.fit(X, Y, new RandomParts(var, var, new double[X.length]), 0.0)
                .orElseThrow()
                .b();
        double mx = java.util.Arrays.stream(X).average().orElseThrow();
        double my = java.util.Arrays.stream(Y).average().orElseThrow();
        double sxx = 0.0;
        double sxy = 0.0;
        double syy = 0.0;
        for (int i = 0; i < X.length; i++) {
            sxx += (X[i] - mx) * (X[i] - mx);
            sxy += (X[i] - mx) * (Y[i] - my);
            syy += (Y[i] - my) * (Y[i] - my);
        }
        double orthogonal = (syy - sxx + Math.sqrt((syy - sxx) * (syy - sxx) + 4.0 * sxy * sxy)) / (2.0 * sxy);
        assertEquals(orthogonal, b, 1e-12);
        double ordinary = sxy / sxx;
        assertNotEquals(ordinary, b, 1e-3);
    }

    /** The stated covariance of the constants is that of the rows applied to the points' own errors. */
    @Test
    void rowsReproduceTheCovariance() {
        BothAxesLine line = pearsonYork(0.5);
        double[][] rows = line.rows();
        double varB = 0.0;
        double cov = 0.0;
        for (int i = 0; i < X.length; i++) {
            varB += rows[1][i] * rows[1][i] / line.weights()[i];
            cov += rows[0][i] * rows[1][i] / line.weights()[i];
        }
        assertEquals(line.varB(), varB, 1e-12);
        assertEquals(line.covAB(), cov, 1e-12);
    }
}
