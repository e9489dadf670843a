package plateledger.report;

import java.util.List;

/** Cautions printed in every report, whatever the findings. */
final class GeneralCautions {
    static final List<String> LIST = List.of(
            "A heated plate without flow runs away in temperature: heater power belongs behind a flow interlock and an"
                    + " over-temperature cut-out with its own sensor (common practice).",
            "A surface stays hot after the power is off; touch it only when its own sensors say it is cool.");

    private GeneralCautions() {}
}
