package plateledger.finding;

import java.util.List;
import java.util.stream.Collectors;

/** Input cannot be used; carries every finding that says why. Nothing has been written when this is thrown. */
public final class RefusedException extends Exception {
    private static final long serialVersionUID = 1L;

    private final transient List<Finding> findings;

    /** Refuses with the findings that led to it, at least one. */
    public RefusedException(List<Finding> findings) {
        super(findings.stream().map(Finding::message).collect(Collectors.joining("\n")));
        if (findings.isEmpty()) {
            throw new IllegalArgumentException("a refusal needs at least one finding");
        }
        this.findings = List.copyOf(findings);
    }

    /** Refuses with one finding. */
    public RefusedException(Finding finding) {
        this(List.of(finding));
    }

    /** All findings behind the refusal. */
    public List<Finding> findings() {
        return findings;
    }
}
