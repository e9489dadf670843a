package plateledger.log;

/** A position in a time cell; the readers of stamps walk with it. */
final class StampCursor {
    private char[] text = new char[0];
    private int at;
    private int end;

    /** Sets the cursor to a cell, blanks around it left out. */
    void over(char[] cell, int offset, int length) {
        text = cell;
        at = offset;
        end = offset + length;
        while (at < end && (text[at] == ' ' || text[at] == '\t')) {
            at++;
        }
        while (end > at && (text[end - 1] == ' ' || text[end - 1] == '\t')) {
            end--;
        }
    }

    boolean atEnd() {
        return at == end;
    }

    /** The character here, or NUL at the end. */
    char peek() {
        return at < end ? text[at] : '\0';
    }

    /** Steps over the character if it stands here. */
    boolean take(char c) {
        if (peek() == c && at < end) {
            at++;
            return true;
        }
        return false;
    }

    /** Reads at least {@code least} and at most {@code most} digits; -1 if there are fewer. */
    int digits(int least, int most) {
        int value = 0;
        int n = 0;
        while (n < most && at < end && text[at] >= '0' && text[at] <= '9') {
            value = value * 10 + (text[at] - '0');
            at++;
            n++;
        }
        return n < least ? -1 : value;
    }

    /** Reads a fraction of a second after '.' or ',' if one stands here, else 0. */
    double fraction() {
        char c = peek();
        if ((c == '.' || c == ',') && at + 1 < end && text[at + 1] >= '0' && text[at + 1] <= '9') {
            at++;
            return fractionDigits();
        }
        return 0.0;
    }

    /** Reads digits as a decimal fraction. */
    double fractionDigits() {
        double scale = 1.0;
        double value = 0.0;
        while (at < end && text[at] >= '0' && text[at] <= '9') {
            scale *= 10.0;
            value = value * 10.0 + (text[at] - '0');
            at++;
        }
        return value / scale;
    }
}
