package plateledger.keyfile;

import java.io.IOException;
import java.nio.ByteBuffer;
import java.nio.CharBuffer;
import java.nio.charset.CharsetDecoder;
import java.nio.charset.CoderResult;
import java.nio.charset.CodingErrorAction;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.Collection;
import java.util.Locale;
import java.util.Optional;
import plateledger.finding.Finding;
import plateledger.finding.Level;
import plateledger.finding.Place;

/** Bytes of a key file to text, with the place of the first byte that is not UTF-8. */
final class Decoding {
    private static final byte[] MARK = {(byte) 0xEF, (byte) 0xBB, (byte) 0xBF};

    private Decoding() {}

    /** The text of a file without its byte-order mark; empty with a finding where it cannot be had. */
    static Optional<String> text(Path file, String name, Collection<Finding> findings) {
        if (!Files.isRegularFile(file)) {
            findings.add(fault("FILE-MISSING", Place.of(name), name, "no such file", "the file", "Create it."));
            return Optional.empty();
        }
        byte[] bytes;
        try {
            bytes = Files.readAllBytes(file);
        } catch (IOException e) {
            String why = e.getClass().getSimpleName() + ": " + e.getMessage();
            findings.add(fault("FILE-UNREADABLE", Place.of(name), name, why, "a readable file", "Check its rights."));
            return Optional.empty();
        }
        return decode(bytes, name, findings);
    }

    private static Optional<String> decode(byte[] bytes, String name, Collection<Finding> findings) {
        int start = 0;
        if (bytes.length >= MARK.length && bytes[0] == MARK[0] && bytes[1] == MARK[1] && bytes[2] == MARK[2]) {
            start = MARK.length;
        }
        ByteBuffer in = ByteBuffer.wrap(bytes, start, bytes.length - start);
        CharBuffer out = CharBuffer.allocate(bytes.length - start + 1);
        CharsetDecoder decoder = StandardCharsets.UTF_8
                .newDecoder()
                .onMalformedInput(CodingErrorAction.REPORT)
                .onUnmappableCharacter(CodingErrorAction.REPORT);
        CoderResult result = decoder.decode(in, out, true);
        String text = out.flip().toString();
        if (!result.isError()) {
            return Optional.of(text);
        }
        int line = 1 + (int) text.chars().filter(c -> c == '\n').count();
        int column = text.length() - text.lastIndexOf('\n');
        String found = String.format(Locale.ROOT, "byte 0x%02X, which is not UTF-8 text", bytes[in.position()]);
        findings.add(fault(
                "FILE-BYTES", new Place(name, line, column), name, found, "UTF-8 text", "Save the file as UTF-8."));
        return Optional.empty();
    }

    private static Finding fault(String id, Place place, String subject, String found, String expected, String remedy) {
        return new Finding(id, Level.STOP, place, subject, found, expected, remedy, "");
    }
}
