package plateledger.keyfile;

/** A node is not what it should be; becomes a finding where the key is known. */
final class Refusal extends Exception {
    private static final long serialVersionUID = 1L;

    private final String id;
    private final String found;
    private final String expected;
    private final String remedy;

    Refusal(String id, String found, String expected, String remedy) {
        super(found);
        this.id = id;
        this.found = found;
        this.expected = expected;
        this.remedy = remedy;
    }

    String id() {
        return id;
    }

    String found() {
        return found;
    }

    String expected() {
        return expected;
    }

    String remedy() {
        return remedy;
    }
}
