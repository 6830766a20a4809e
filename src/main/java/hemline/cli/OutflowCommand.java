package hemline.cli;

import hemline.numerics.Estimate;
import hemline.workflow.AssessOutflow;
import hemline.workflow.OutflowRequest;
import hemline.workflow.OutflowRequest.Air;
import hemline.workflow.UserProblem;
import java.io.PrintWriter;
import java.util.Optional;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.ParameterException;
import picocli.CommandLine.Spec;

/** {@code hemline outflow}: theory for given observations. */
@Command(name = "outflow", mixinStandardHelpOptions = true, versionProvider = VersionProvider.class,
        sortOptions = false,
        description = "Tells what density-current theory says of what was observed of an outflow boundary.",
        footer = {"", "Give what is known; the rest is worked out where it can be. VALUE may be 8.6 or 8.6+-0.5, the",
            "number after +- being the standard deviation; without it a usual one is taken and said.",
            "  hemline outflow --temperature 30,26.5 --dew-point 18,17 --pressure 985 --depth 1300 --speed 8.6+-0.5"})
final class OutflowCommand implements Callable<Integer> {
    @Spec
    private CommandSpec spec;

    @Option(names = "--temperature", paramLabel = "AHEAD,BEHIND", converter = AheadBehind.Converter.class,
            description = "Air temperature, degrees Celsius; needs --pressure.")
    private AheadBehind temperature;

    @Option(names = "--dew-point", paramLabel = "AHEAD,BEHIND", converter = AheadBehind.Converter.class,
            description = "Dew point, degrees Celsius.")
    private AheadBehind dewPoint;

    @Option(names = "--pressure", paramLabel = "AHEAD,BEHIND", converter = AheadBehind.Converter.class,
            description = "Station pressure, hPa, not reduced to sea level; one value serves for both sides.")
    private AheadBehind pressure;

    @Option(names = "--condensate", paramLabel = "G/KG", defaultValue = "0",
            description = "Rain and cloud water in the cold air, g/kg (default: ${DEFAULT-VALUE}).")
    private double condensate;

    @Option(names = "--deficit", paramLabel = "VALUE", converter = EstimateConverter.class,
            description = "Deficit of density potential temperature, K, instead of the two states.")
    private Estimate deficit = Estimate.UNKNOWN;

    @Option(names = "--depth", paramLabel = "VALUE", converter = EstimateConverter.class,
            description = "Depth of the cold air, m.")
    private Estimate depth = Estimate.UNKNOWN;

    @Option(names = "--air-depth", paramLabel = "METRES",
            description = "Depth of the air it runs under, up to the lowest stable layer.")
    private Double airDepth;

    @Option(names = "--rise", paramLabel = "VALUE", converter = EstimateConverter.class,
            description = "Hydrostatic pressure rise behind the boundary, hPa.")
    private Estimate rise = Estimate.UNKNOWN;

    @Option(names = "--speed", paramLabel = "VALUE", converter = EstimateConverter.class,
            description = "Speed of the boundary over the ground, m/s.")
    private Estimate speed = Estimate.UNKNOWN;

    @Option(names = "--wind", paramLabel = "VALUE", converter = EstimateConverter.class,
            description = "Wind ahead along the motion, m/s; negative for a head wind.")
    private Estimate wind = Estimate.UNKNOWN;

    @Option(names = "--law", paramLabel = "NAME", defaultValue = "observed",
            description = "Law for k: observed (default), deep, benjamin or huppert-simpson.")
    private String law;

    @Option(names = "--k", paramLabel = "VALUE", converter = EstimateConverter.class,
            description = "k itself, instead of the law.")
    private Estimate froude = Estimate.UNKNOWN;

    @Override
    public Integer call() throws UserProblem {
        if (spec.commandLine().getParseResult().matchedOptions().isEmpty()) {
            throw new ParameterException(spec.commandLine(), "give at least one observation, for example --speed");
        }
        if ((temperature == null) != (pressure == null)) {
            throw new ParameterException(spec.commandLine(), "--temperature and --pressure need each other");
        }
        OutflowRequest request = new OutflowRequest(ahead(), behind(), deficit, depth,
                airDepth == null ? Double.NaN : airDepth, rise, speed, wind, law, froude);
        String text = new AssessOutflow().text(request);
        PrintWriter out = spec.commandLine().getOut();
        out.print(text);
        out.flush();
        return ExitCodes.DONE;
    }

    private Optional<Air> ahead() {
        return temperature == null ? Optional.empty() : Optional.of(new Air(temperature.ahead(),
                dewPoint == null ? Double.NaN : dewPoint.ahead(), pressure.ahead(), 0));
    }

    private Optional<Air> behind() {
        return temperature == null || Double.isNaN(temperature.behind()) ? Optional.empty()
                : Optional.of(new Air(temperature.behind(), dewPoint == null ? Double.NaN : dewPoint.behind(),
                Double.isNaN(pressure.behind()) ? pressure.ahead() : pressure.behind(), condensate));
    }
}
