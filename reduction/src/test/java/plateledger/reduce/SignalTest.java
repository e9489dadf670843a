package plateledger.reduce;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.BitSet;
import org.junit.jupiter.api.Test;

/** One channel's equation, by hand. */
final class SignalTest {
    /** Mean 310 K, bath 0.1 K, own 0.02 K, gain 0.001, own gain 0.0005, drift 0.03 K, gain errors vanish at 295 K. */
    private static final double[] IN = {310.0, 0.1, 0.02, 0.001, 0.0005, 0.03, 300.0};

    private static final Signal SIGNAL = new Signal(0, 1, 2, 3, 4, 5, 295.0);

    /** 310 − 0.12 − 0.0015·15 − 0.03. */
    @Test
    void byTheCertificate() {
        assertEquals(309.8275, SIGNAL.value(Reads.of(IN)), 1e-10);
        assertEquals(310.0, SIGNAL.raw(Reads.of(IN)), 0.0);
    }

    /** 310 − 0.2 − 0.0015·14 − 0.03: the zero took bath and own offset with it, the gain counts from the zero's reading. */
    @Test
    void againstAZeroInPlace() {
        assertEquals(309.749, SIGNAL.againstZero(Reads.of(IN), 0.2, 296.0), 1e-10);
    }

    /** The second channel reads 300 K with the same errors: 300 − 0.12 − 0.0015·5 − 0.03 = 299.8425. */
    @Test
    void meanOfTwo() {
        Signal second = new Signal(6, 1, 2, 3, 4, 5, 295.0);
        assertEquals(304.835, Signal.mean(Reads.of(IN), new Signal[] {SIGNAL, second}), 1e-10);
    }

    @Test
    void whatIsReadIsNoted() {
        BitSet certificate = new BitSet();
        SIGNAL.value(Reads.recording(IN, certificate));
        assertEquals("{0, 1, 2, 3, 4, 5}", certificate.toString());
        BitSet zero = new BitSet();
        SIGNAL.againstZero(Reads.recording(IN, zero), 0.0, 295.0);
        assertEquals("{0, 3, 4, 5}", zero.toString());
    }
}
