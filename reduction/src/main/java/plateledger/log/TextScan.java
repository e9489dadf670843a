package plateledger.log;

import java.io.BufferedReader;
import java.io.IOException;
import java.io.InputStream;
import java.io.InputStreamReader;
import java.io.Reader;
import java.nio.charset.Charset;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.NoSuchFileException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import plateledger.finding.Finding;
import plateledger.finding.Level;
import plateledger.finding.Place;
import plateledger.finding.RefusedException;

/**
 * What one pass over the bytes of a file tells: that it is text, how it is coded, how it begins and whether its last line
 * is complete.
 *
 * @param path the file
 * @param file its name for messages, relative to the campaign folder
 * @param charset UTF-8 if the bytes are valid UTF-8, else ISO-8859-1
 * @param bom true if a UTF-8 byte order mark stands in front
 * @param lastLineComplete true if the file ends with a line end
 * @param head the first lines
 */
record TextScan(Path path, String file, Charset charset, boolean bom, boolean lastLineComplete, List<String> head) {
    private static final int HEAD_LINES = 400;
    private static final int HEAD_CHARS = 1 << 20;
    private static final int BLOCK = 1 << 16;

    /** First bytes of what is often mistaken for a log; from the formats' own specifications. */
    private static final List<Magic> MAGICS = List.of(
            new Magic("a zip archive or a spreadsheet workbook", 'P', 'K', 3, 4),
            new Magic("an old spreadsheet workbook", 0xD0, 0xCF, 0x11, 0xE0),
            new Magic("a gzip archive", 0x1F, 0x8B),
            new Magic("a PDF document", '%', 'P', 'D', 'F'),
            new Magic("an image", 0x89, 'P', 'N', 'G'),
            new Magic("an image", 0xFF, 0xD8, 0xFF),
            new Magic("text in UTF-16", 0xFF, 0xFE),
            new Magic("text in UTF-16", 0xFE, 0xFF));

    TextScan {
        head = List.copyOf(head);
    }

    /** Scans a file. */
    static TextScan of(Path path, String file) throws RefusedException {
        if (!Files.isRegularFile(path)) {
            throw refused(
                    "LOG-MISSING",
                    file,
                    0,
                    "no such file",
                    "the log named in the campaign",
                    "Put the file there or correct its name.");
        }
        try {
            Bytes bytes = bytes(path, file);
            Charset charset = bytes.utf8 ? StandardCharsets.UTF_8 : StandardCharsets.ISO_8859_1;
            List<String> head;
            try (Reader reader = open(path, charset, bytes.bom)) {
                head = head(reader);
            }
            if (head.isEmpty()) {
                throw refused(
                        "LOG-EMPTY-FILE",
                        file,
                        0,
                        "an empty file",
                        "a log with titles and rows",
                        "Export the log again.");
            }
            return new TextScan(path, file, charset, bytes.bom, bytes.lineEnd, head);
        } catch (NoSuchFileException e) {
            throw refused(
                    "LOG-MISSING",
                    file,
                    0,
                    "no such file",
                    "the log named in the campaign",
                    "Put the file there or correct its name.");
        } catch (IOException e) {
            throw refused(
                    "LOG-UNREADABLE",
                    file,
                    0,
                    "a file that cannot be read (" + e.getMessage() + ")",
                    "a readable file",
                    "Check the disk and the permissions.");
        }
    }

    /** The text of the file from its first character. */
    Reader open() throws IOException {
        return open(path, charset, bom);
    }

    /** A refusal at a line of this file. */
    RefusedException refused(
            String id, long line, int column, String subject, String found, String expected, String remedy) {
        return new RefusedException(
                new Finding(id, Level.STOP, new Place(file, line, column), subject, found, expected, remedy, ""));
    }

    private static RefusedException refused(
            String id, String file, long line, String found, String expected, String remedy) {
        return new RefusedException(
                new Finding(id, Level.STOP, new Place(file, line, 0), "log file", found, expected, remedy, ""));
    }

    private static Reader open(Path path, Charset charset, boolean bom) throws IOException {
        InputStream in = Files.newInputStream(path);
        try {
            in.skipNBytes(bom ? 3 : 0);
            return new InputStreamReader(in, charset);
        } catch (IOException e) {
            in.close();
            throw e;
        }
    }

    private static List<String> head(Reader reader) throws IOException {
        List<String> lines = new ArrayList<>();
        BufferedReader buffered = new BufferedReader(new Bounded(reader, HEAD_CHARS));
        String line = buffered.readLine();
        while (line != null && lines.size() < HEAD_LINES) {
            lines.add(line);
            line = buffered.readLine();
        }
        return lines;
    }

    private static Bytes bytes(Path path, String file) throws IOException, RefusedException {
        Bytes state = new Bytes();
        byte[] block = new byte[BLOCK];
        try (InputStream in = Files.newInputStream(path)) {
            int n = in.readNBytes(block, 0, BLOCK);
            for (Magic magic : MAGICS) {
                if (magic.matches(block, n)) {
                    throw notText(file, magic.what, 1);
                }
            }
            state.bom = n >= 3 && (block[0] & 0xFF) == 0xEF && (block[1] & 0xFF) == 0xBB && (block[2] & 0xFF) == 0xBF;
            while (n > 0) {
                if (!state.take(block, n)) {
                    throw notText(file, "a binary file (a zero byte)", state.line);
                }
                n = in.readNBytes(block, 0, BLOCK);
            }
        }
        state.utf8 &= state.following == 0;
        return state;
    }

    private static RefusedException notText(String file, String what, long line) {
        return refused(
                "LOG-BINARY",
                file,
                line,
                what,
                "a text file in UTF-8 or ISO-8859-1",
                "Export the log as delimited text.");
    }

    private record Magic(String what, int... start) {
        boolean matches(byte[] bytes, int n) {
            if (n < start.length) {
                return false;
            }
            for (int i = 0; i < start.length; i++) {
                if ((bytes[i] & 0xFF) != start[i]) {
                    return false;
                }
            }
            return true;
        }
    }

    /** State of the pass over the bytes: valid UTF-8 (RFC 3629, section 4) so far, lines so far, line end last. */
    private static final class Bytes {
        private boolean bom;
        private boolean utf8 = true;
        private boolean lineEnd;
        private long line = 1;
        private int following;
        private int low = 0x80;
        private int high = 0xBF;

        /** Takes a block; false at a zero byte. */
        boolean take(byte[] block, int n) {
            for (int i = 0; i < n; i++) {
                int b = block[i] & 0xFF;
                if (b == 0) {
                    return false;
                }
                if (b == '\n') {
                    line++;
                }
                if (utf8 && (b >= 0x80 || following > 0)) {
                    multiByte(b);
                }
            }
            lineEnd = block[n - 1] == '\n' || block[n - 1] == '\r';
            return true;
        }

        private void multiByte(int b) {
            if (following > 0) {
                utf8 = b >= low && b <= high;
                low = 0x80;
                high = 0xBF;
                following--;
            } else if (b >= 0xC2 && b <= 0xDF) {
                following = 1;
            } else if (b >= 0xE0 && b <= 0xEF) {
                following = 2;
                low = b == 0xE0 ? 0xA0 : 0x80;
                high = b == 0xED ? 0x9F : 0xBF;
            } else if (b >= 0xF0 && b <= 0xF4) {
                following = 3;
                low = b == 0xF0 ? 0x90 : 0x80;
                high = b == 0xF4 ? 0x8F : 0xBF;
            } else {
                utf8 = false;
            }
        }
    }

    /** Ends after a number of characters, so that one endless line cannot fill the memory. */
    private static final class Bounded extends Reader {
        private final Reader inner;
        private int left;

        Bounded(Reader inner, int most) {
            this.inner = inner;
            this.left = most;
        }

        @Override
        public int read(char[] target, int offset, int length) throws IOException {
            if (left == 0) {
                return -1;
            }
            int n = inner.read(target, offset, Math.min(length, left));
            left -= Math.max(n, 0);
            return n;
        }

        @Override
        public void close() throws IOException {
            inner.close();
        }
    }
}
