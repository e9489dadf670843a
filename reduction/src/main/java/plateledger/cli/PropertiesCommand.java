package plateledger.cli;

import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.ParameterException;
import picocli.CommandLine.Spec;
import plateledger.finding.RefusedException;
import plateledger.fluid.PropertyTable;
import plateledger.quantity.Dimension;
import plateledger.quantity.QuantityFormatException;
import plateledger.quantity.QuantityText;
import plateledger.quantity.Temperature;

/** Fluid properties at one state, with the uncertainty of the formulation. */
@Command(
        name = "properties",
        mixinStandardHelpOptions = true,
        description = "Prints density, viscosity, conductivity, heat capacity, Pr of a fluid, with uncertainty.",
        footerHeading = "%nExample:%n",
        footer = "  plateledger properties --fluid air --temperature 35C --pressure 98kPa --humidity 40%%")
final class PropertiesCommand implements Callable<Integer> {
    private final Terminal terminal;

    @Spec
    @SuppressWarnings("NullAway.Init") // set by the command line parser before anything runs
    private CommandSpec spec;

    @Option(names = "--fluid", required = true, paramLabel = "FLUID", description = "air")
    private String fluid = "air";

    @Option(names = "--temperature", required = true, paramLabel = "T", description = "e.g. 35C or \"308.15 K\"")
    private String temperature = "";

    @Option(names = "--pressure", required = true, paramLabel = "P", description = "absolute, e.g. 98kPa")
    private String pressure = "";

    @Option(
            names = "--humidity",
            paramLabel = "RH",
            description = "relative humidity over liquid water at that temperature, e.g. 40%%; 0%% if not given")
    private String humidity = "0 %";

    PropertiesCommand(Terminal terminal) {
        this.terminal = terminal;
    }

    @Override
    public Integer call() {
        double t = quantity("--temperature", temperature, Dimension.TEMPERATURE);
        double p = quantity("--pressure", pressure, Dimension.PRESSURE);
        double rh = quantity("--humidity", humidity, Dimension.NUMBER);
        try {
            PropertyTable.of(fluid, new Temperature(t), p, rh).lines().forEach(terminal.out()::println);
            terminal.out().flush();
            return ExitStatus.DONE;
        } catch (RefusedException e) {
            FindingList.full().print(terminal.err(), e.findings());
            return ExitStatus.NOTHING_WRITTEN;
        }
    }

    private double quantity(String option, String text, Dimension dimension) {
        try {
            return QuantityText.setting(text, dimension);
        } catch (QuantityFormatException e) {
            throw new ParameterException(
                    spec.commandLine(),
                    option + ": found " + e.found() + ", expected " + e.expected()
                            + (e.remedy().isEmpty() ? "" : ". " + e.remedy()));
        }
    }
}
