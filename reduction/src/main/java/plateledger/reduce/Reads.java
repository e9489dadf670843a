package plateledger.reduce;

import java.util.BitSet;
import java.util.Optional;

/** A view of the input vector; while recording it notes which inputs a stage reads, so that dependencies need no list. */
final class Reads {
    private final double[] in;
    private final Optional<BitSet> seen;

    private Reads(double[] in, Optional<BitSet> seen) {
        this.in = in;
        this.seen = seen;
    }

    static Reads of(double[] in) {
        return new Reads(in, Optional.empty());
    }

    static Reads recording(double[] in, BitSet seen) {
        return new Reads(in, Optional.of(seen));
    }

    double get(int position) {
        if (seen.isPresent()) {
            seen.get().set(position);
        }
        return in[position];
    }
}
