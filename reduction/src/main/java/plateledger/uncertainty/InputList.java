package plateledger.uncertainty;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;

/** An ordered list of inputs with unique names: the argument vector of a reduction. Immutable. */
public final class InputList {
    private final List<Input> inputs;
    private final Map<String, Integer> positions;

    private InputList(List<Input> inputs, Map<String, Integer> positions) {
        this.inputs = List.copyOf(inputs);
        this.positions = Map.copyOf(positions);
    }

    /** Collects inputs in order; a name used twice is refused. */
    public static final class Builder {
        private final List<Input> inputs = new ArrayList<>();
        private final Map<String, Integer> positions = new HashMap<>();

        /** Adds one input and returns its position. */
        public int add(Input input) {
            if (positions.putIfAbsent(input.name(), inputs.size()) != null) {
                throw new IllegalArgumentException("input named twice: " + input.name());
            }
            inputs.add(input);
            return inputs.size() - 1;
        }

        /** The finished list. */
        public InputList build() {
            return new InputList(inputs, positions);
        }
    }

    /** Number of inputs. */
    public int size() {
        return inputs.size();
    }

    /** The input at a position from 0. */
    public Input get(int position) {
        return inputs.get(position);
    }

    /** All inputs in order. */
    public List<Input> inputs() {
        return inputs;
    }

    /** Position of a name; refuses an unknown one. */
    public int position(String name) {
        Integer position = positions.get(name);
        if (position == null) {
            throw new IllegalArgumentException("no input named " + name);
        }
        return position;
    }

    /** The best estimates, a fresh array in list order. */
    public double[] values() {
        return inputs.stream().mapToDouble(Input::value).toArray();
    }
}
