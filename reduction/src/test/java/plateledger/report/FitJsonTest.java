package plateledger.report;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.fasterxml.jackson.core.JsonFactory;
import com.fasterxml.jackson.core.JsonParser;
import com.fasterxml.jackson.core.JsonToken;
import java.nio.charset.StandardCharsets;
import java.util.LinkedHashMap;
import java.util.Map;
import org.junit.jupiter.api.Test;

final class FitJsonTest {
    private static final byte[] BYTES = FitJson.bytes(InventedCampaign.result());

    /** Every number by its path, e.g. {@code /fits/constants/C}; of an array the last. */
    private static Map<String, Double> numbers() throws Exception {
        Map<String, Double> numbers = new LinkedHashMap<>();
        try (JsonParser parser = new JsonFactory().createParser(BYTES)) {
            for (JsonToken token = parser.nextToken(); token != null; token = parser.nextToken()) {
                if (token.isNumeric()) {
                    numbers.put(parser.getParsingContext().pathAsPointer().toString(), parser.getDoubleValue());
                }
            }
        }
        return numbers;
    }

    @Test
    void startsWithItsFormat() {
        assertTrue(new String(BYTES, StandardCharsets.UTF_8).startsWith("{\n  \"format\" : \"plateledger-fit/1\","));
    }

    @Test
    void covarianceOfLnCFollowsFromTheCentredOne() throws Exception {
        Map<String, Double> n = numbers();
        // by hand for xg 12.4, var a 1e-4, var m 9e-5, cov 1e-6:
        // var ln C = 1e-4 - 2*12.4*1e-6 + 153.76*9e-5 = 0.0139136; cov(ln C, m) = 1e-6 - 12.4*9e-5 = -0.001115
        assertEquals(0.0139136, n.getOrDefault("/fits/0/covariance/matrix/0/0", Double.NaN), 1e-12);
        assertEquals(-0.001115, n.getOrDefault("/fits/0/covariance/matrix/0/1", Double.NaN), 1e-15);
        assertEquals(-0.001115, n.getOrDefault("/fits/0/covariance/matrix/1/0", Double.NaN), 1e-15);
        assertEquals(9e-5, n.getOrDefault("/fits/0/covariance/matrix/1/1", Double.NaN), 1e-18);
        // C = exp(6.3 - 0.83*12.4) = exp(-3.992)
        assertEquals(0.018462752, n.getOrDefault("/fits/0/constants/C", Double.NaN), 1e-9);
        assertEquals(140_000.0, n.getOrDefault("/fits/0/range/Re/0", Double.NaN), 0.0);
        assertEquals(346_000.0, n.getOrDefault("/fits/0/range/Re/1", Double.NaN), 0.0);
    }

    @Test
    void aTestThatWasNotMadeIsNullAndLeftOutRunsCarryTheirReason() {
        String text = new String(BYTES, StandardCharsets.UTF_8);
        assertTrue(text.contains("\"lack_of_fit_F\" : null"));
        assertTrue(text.contains("\"reason\" : \"storage bound 2.3 % of the power, limit 1 %\""));
        assertTrue(text.contains("\"reason\" : \"door was open\""));
    }
}
