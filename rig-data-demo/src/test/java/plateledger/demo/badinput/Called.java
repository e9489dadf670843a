package plateledger.demo.badinput;

import static org.junit.jupiter.api.Assertions.assertAll;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.PrintWriter;
import java.io.StringWriter;
import java.util.List;
import plateledger.cli.CommandLineProgram;
import plateledger.cli.Terminal;
import plateledger.report.OutputFolder;

/** One call of the command line in this process, and what came of it. */
record Called(int status, String out, String err) {
    static Called with(String... args) {
        return with(OutputFolder.TO_DISK, args);
    }

    static Called with(OutputFolder.Writing writing, String... args) {
        StringWriter out = new StringWriter();
        StringWriter err = new StringWriter();
        int status = CommandLineProgram.run(
                new Terminal(new PrintWriter(out, true), new PrintWriter(err, true), false), writing, args);
        return new Called(status, out.toString(), err.toString());
    }

    /** Holds if it was refused in one finding that tells where, what was found, what was expected and what to do. */
    void refusedOnce(String where, String found, String expected, String remedy) {
        assertAll(
                () -> assertEquals(2, status, this::everythingSaid),
                () -> assertEquals("", out, "results on standard output"),
                () -> assertTrue(err.startsWith("stop (1)" + System.lineSeparator()), err),
                () -> names(where, found, expected, remedy),
                this::noTrace);
    }

    /** Holds if one line names all four. */
    void names(String where, String found, String expected, String remedy) {
        List<String> like =
                err.lines().filter(line -> line.strip().startsWith(where)).toList();
        assertFalse(like.isEmpty(), () -> "no line begins with " + where + " in:\n" + err);
        assertTrue(
                like.stream()
                        .anyMatch(line -> line.matches(".*: found .*" + quoted(found) + ".*; expected .*"
                                + quoted(expected) + ".*\\. .*" + quoted(remedy) + ".*")),
                () -> "found " + found + "; expected " + expected + ". " + remedy + " is not in:\n" + like);
    }

    /** Holds if no stack trace was printed. */
    void noTrace() {
        assertFalse(err.contains("\n    at ") || err.contains("Exception"), err);
    }

    String everythingSaid() {
        return "status " + status + "\n" + out + "\n" + err;
    }

    private static String quoted(String text) {
        return java.util.regex.Pattern.quote(text);
    }
}
