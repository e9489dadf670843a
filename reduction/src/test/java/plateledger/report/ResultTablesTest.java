package plateledger.report;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.Locale;
import java.util.TimeZone;
import org.junit.jupiter.api.Test;
import plateledger.finding.Finding;
import plateledger.finding.Level;
import plateledger.finding.Place;
import plateledger.reduce.CampaignResult;

final class ResultTablesTest {
    private static List<String> lines(byte[] table) {
        return List.of(new String(table, StandardCharsets.UTF_8).split("\n", -1));
    }

    @Test
    void stationTableHasTheAgreedColumnsAndARowPerStation() {
        List<String> lines = lines(ResultTables.stations(InventedCampaign.result()));
        assertEquals(
                "run,station,x_m,u_x_m,T_surface_K,u_T_surface_K,T_ref_K,u_T_ref_K,T_film_K,u_T_film_K,"
                        + "q_electrical_W_per_m2,u_q_electrical_W_per_m2,q_radiation_W_per_m2,u_q_radiation_W_per_m2,"
                        + "q_back_W_per_m2,u_q_back_W_per_m2,q_conduction_W_per_m2,u_q_conduction_W_per_m2,"
                        + "q_conv_W_per_m2,u_q_conv_W_per_m2,h_W_per_m2K,u_h_W_per_m2K,"
                        + "h_equivalent_uniform_W_per_m2K,u_h_equivalent_uniform_W_per_m2K,Re_x,u_Re_x,Nu_x,u_Nu_x,"
                        + "Pr,u_Pr,Nu_x_theory,u_Nu_x_theory,En",
                lines.get(0));
        assertEquals(1 + 5 * 3 + 1, lines.size(), "title, five reduced runs of three stations, end of file");
        assertTrue(lines.get(1).startsWith("B01,T01,0.1125,2.0E-4,315.25,0.06,295.25,0.05,305.25,0.05,333.3,0.4,"));
        assertTrue(lines.get(1).contains(",-3.75,0.8,"), "a negative number stays a number");
        assertTrue(lines.get(7).endsWith(",,,"), "no theory, no cell: " + lines.get(7));
    }

    @Test
    void runTableHasARowForEveryRunReducedOrNot() {
        List<String> lines = lines(ResultTables.runs(InventedCampaign.result()));
        assertEquals(
                "run,type,plate,regime,set,state,reason,window_start,window_end,U_m_per_s,u_U_m_per_s,Re_L,u_Re_L,"
                        + "Nu_L,u_Nu_L,Pr,u_Pr,Q_electrical_W,u_Q_electrical_W,Q_convection_W,u_Q_convection_W,"
                        + "Q_radiation_W,u_Q_radiation_W,Q_back_W,u_Q_back_W,Q_edge_W,u_Q_edge_W,Q_conduction_nose_W,"
                        + "u_Q_conduction_nose_W,Q_conduction_tail_W,u_Q_conduction_tail_W,Q_guard_W,u_Q_guard_W,"
                        + "Q_lead_W,u_Q_lead_W,Q_storage_W,u_Q_storage_W,Q_residual_W,u_Q_residual_W",
                lines.get(0));
        assertEquals(1 + 8 + 1, lines.size());
        assertTrue(
                lines.get(2)
                        .startsWith("B01,heated,baseline,laminar,L1,reduced,,2026-03-10T11:20:00+01:00,"
                                + "2026-03-10T11:40:00+01:00,2.02,0.02,70000.0,"),
                lines.get(2));
        assertTrue(lines.get(7).startsWith("P04,heated,product,product,S3,not steady,"));
        assertTrue(lines.get(8).contains("door was open"));
    }

    @Test
    void budgetTableHasTheAgreedColumns() {
        List<String> lines = lines(ResultTables.budget(InventedCampaign.result()));
        assertEquals("run,output,input,share_percent,contribution,u,sensitivity,distribution,dof,scope", lines.get(0));
        assertEquals("B01,Nu_L,baseline.emissivity,61.5,-0.5,0.015,-33.0,normal,inf,panel:baseline", lines.get(1));
    }

    @Test
    void findingTextThatASpreadsheetWouldRunIsNeutralised() {
        String table =
                new String(ResultTables.findings(InventedCampaign.result().findings()), StandardCharsets.UTF_8);
        assertTrue(table.startsWith("id,level,subject,place,found,expected,remedy,source\n"), table);
        assertTrue(table.contains(",'=no clock offset,"), table);
        assertTrue(table.contains(",'-declare it,"), table);
        assertTrue(table.contains("\"logger <tunnel> & \"\"co\"\"\""), table);
        List<String> lines = List.of(table.split("\n"));
        assertTrue(lines.get(1).startsWith("RUN-NOT-STEADY,stop,"), "gravest first");
        assertTrue(lines.get(2).contains(",logs/B01-plate.txt:412:9,"));
    }

    @Test
    void allFourDangerousFirstCharactersAreNeutralised() {
        for (String text : List.of("=1+1", "+1", "-1", "@SUM(A1)", "\t=1")) {
            Finding finding = new Finding("X", Level.NOTE, Place.NOWHERE, text, "f", "e", "r", "s");
            String table = new String(ResultTables.findings(List.of(finding)), StandardCharsets.UTF_8);
            assertTrue(table.contains("'" + text), table);
        }
    }

    @Test
    void numbersComeBackBitByBit() {
        for (double value : new double[] {0.1, 1.0 / 3.0, 6.02214076e23, -1.5e-300, Math.PI, Double.MIN_VALUE}) {
            assertEquals(value, Double.parseDouble(Table.digits(value)), 0.0);
        }
    }

    @Test
    void tablesAreTheSameBytesInEveryLocaleAndTimeZone() {
        CampaignResult result = InventedCampaign.result();
        byte[] runs = ResultTables.runs(result);
        byte[] stations = ResultTables.stations(result);
        byte[] budget = ResultTables.budget(result);
        byte[] fit = FitJson.bytes(result);
        Locale before = Locale.getDefault();
        TimeZone zone = TimeZone.getDefault();
        try {
            for (Locale locale : List.of(Locale.GERMANY, Locale.forLanguageTag("ar-EG-u-nu-arab"))) {
                Locale.setDefault(locale);
                TimeZone.setDefault(TimeZone.getTimeZone("Asia/Kathmandu"));
                assertArrayEquals(runs, ResultTables.runs(result));
                assertArrayEquals(stations, ResultTables.stations(result));
                assertArrayEquals(budget, ResultTables.budget(result));
                assertArrayEquals(fit, FitJson.bytes(result));
            }
        } finally {
            Locale.setDefault(before);
            TimeZone.setDefault(zone);
        }
        assertFalse(new String(runs, StandardCharsets.UTF_8).contains("\r"));
    }
}
