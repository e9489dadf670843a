package plateledger.gui.model;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import plateledger.gui.SampleCampaign;

final class WindowModelTest {
    private static final Path DOOR = Path.of("campaigns", "door");
    private static final Path OTHER = Path.of("campaigns", "other");

    private final WindowModel model = new WindowModel();

    @Test
    void theFirstReducedHeatedRunIsChosenWhenACampaignIsDone() {
        model.started(DOOR);
        assertTrue(model.state().activity().busy());
        model.finished(DOOR, SampleCampaign.result());

        assertEquals(Optional.of(SampleCampaign.FIRST_RUN), model.state().chosenRun());
        assertEquals(Freshness.CURRENT, model.state().freshness());
        assertFalse(model.state().activity().busy());
    }

    @Test
    void theFormerResultStaysAndIsMarkedWhileANewOneIsComputed() {
        model.finished(DOOR, SampleCampaign.result());
        model.choose("P04");
        model.started(DOOR);

        assertEquals(Freshness.FORMER, model.state().freshness());
        assertTrue(model.state().shown().isPresent());
        assertFalse(model.state().canReduceAgain());

        model.finished(DOOR, SampleCampaign.result());
        assertEquals(Optional.of("P04"), model.state().chosenRun());
        assertEquals(2, model.state().revision());
    }

    @Test
    void aRefusalOfTheSameCampaignLeavesItsFormerResultAndSaysSo() {
        model.finished(DOOR, SampleCampaign.result());
        model.started(DOOR);
        model.refused(DOOR, SampleCampaign.result().findings());

        assertEquals(Freshness.FORMER, model.state().freshness());
        Notice notice = model.state().notice().orElseThrow();
        assertEquals("door was not reduced: 4 findings", notice.heading());
        assertTrue(notice.body().startsWith("What is shown is the former result of this campaign."));
        assertTrue(notice.body().contains("stop: campaign.toml:88: P03: found no steady window"));
    }

    @Test
    void aRefusalOfAnotherCampaignLeavesTheOneShownAsItWas() {
        model.finished(DOOR, SampleCampaign.result());
        model.started(OTHER);
        model.refused(OTHER, SampleCampaign.result().findings());

        assertEquals(Freshness.CURRENT, model.state().freshness());
        assertTrue(model.state().notice().orElseThrow().body().startsWith("What is shown is still door."));
    }

    @Test
    void stoppingIsShownUntilItHasStopped() {
        model.started(DOOR);
        model.progressed("steady windows", 0.4);
        assertTrue(model.state().canStop());
        model.stopping();
        assertFalse(model.state().canStop());
        assertEquals(
                new Activity.Working(DOOR, "steady windows", 0.4, true),
                model.state().activity());
        model.stopped(DOOR);
        assertFalse(model.state().activity().busy());
    }

    @Test
    void progressBeyondItsBoundsIsCutAndProgressWithoutWorkIsIgnored() {
        model.progressed("late", 0.5);
        assertFalse(model.state().activity().busy());
        model.started(DOOR);
        model.progressed("x", 1.7);
        assertEquals(new Activity.Working(DOOR, "x", 1.0, false), model.state().activity());
    }

    @Test
    void onlyRunsOfTheResultCanBeChosenAndObserversHearEachChangeOnce() {
        model.finished(DOOR, SampleCampaign.result());
        List<WindowState> heard = new ArrayList<>();
        model.observe(heard::add);
        model.choose("no such run");
        model.choose("P04");
        model.choose("P04");

        assertEquals(2, heard.size());
        assertEquals("P04", heard.get(1).chosen().orElseThrow().run().id());
    }

    @Test
    void findingsAreThoseOfTheChosenRunOrOfTheCampaign() {
        model.finished(DOOR, SampleCampaign.result());
        assertEquals(1, model.state().findings().size());
        assertEquals("LOG-STUCK", model.state().findings().get(0).id());
        model.listFindings(FindingScope.CAMPAIGN);
        assertEquals(4, model.state().findings().size());
        assertEquals("STEADY-NONE", model.state().findings().get(0).id());
    }

    @Test
    void headlineCountsRunsAndFindings() {
        assertEquals("No campaign open", Headline.of(model.state()).title());
        model.finished(DOOR, SampleCampaign.result());
        assertEquals(
                "10 of 12 runs reduced · 1 stop · 1 caution · 1 note · 1 not checked · " + DOOR,
                Headline.of(model.state()).status());
        model.started(DOOR);
        assertTrue(Headline.of(model.state()).status().startsWith("former result · "));
    }
}
