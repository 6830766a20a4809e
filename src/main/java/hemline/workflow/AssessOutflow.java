package hemline.workflow;

import hemline.numerics.Estimate;
import hemline.outflow.AirState;
import hemline.outflow.FrontLaw;
import hemline.outflow.OutflowTheory;
import hemline.outflow.TheoryInput;
import hemline.outflow.TheoryText;
import java.util.Arrays;
import java.util.Optional;
import java.util.stream.Collectors;

/** Density-current theory on given observations. */
public final class AssessOutflow {

    /**
     * What theory says, as text.
     *
     * @throws UserProblem if an observation is out of bounds
     */
    public String text(OutflowRequest request) throws UserProblem {
        try {
            return TheoryText.of(OutflowTheory.assess(input(request)));
        } catch (IllegalArgumentException e) {
            throw new UserProblem(UserProblem.Kind.USAGE, e.getMessage() + "; see hemline outflow --help", e);
        }
    }

    private static TheoryInput input(OutflowRequest r) {
        return new TheoryInput(r.ahead().map(AssessOutflow::air), r.behind().map(AssessOutflow::air),
                withShare(r.deficitK(), TheoryInput.DEFICIT_SHARE), withShare(r.depthM(), TheoryInput.DEPTH_SHARE),
                r.airDepthM(), withShare(r.riseHpa(), TheoryInput.RISE_SHARE), r.speedMs(),
                withSd(r.windAlongMs(), TheoryInput.WIND_SD_MS), law(r.law()),
                withShare(r.froude(), TheoryInput.FROUDE_SHARE));
    }

    private static AirState air(OutflowRequest.Air air) {
        return new AirState(air.temperatureC(), air.dewPointC(), air.pressureHpa(), air.condensateGPerKg());
    }

    private static Estimate withShare(Estimate given, double share) {
        return given.isKnown() && given.sd() == 0 ? Estimate.relative(given.value(), share) : given;
    }

    private static Estimate withSd(Estimate given, double sd) {
        return given.isKnown() && given.sd() == 0 ? new Estimate(given.value(), sd) : given;
    }

    private static FrontLaw law(String name) {
        Optional<FrontLaw> found = Arrays.stream(FrontLaw.values()).filter(l -> l.label().equals(name)).findFirst();
        return found.orElseThrow(() -> new IllegalArgumentException("there is no law '" + name + "'; there are "
                + Arrays.stream(FrontLaw.values()).map(FrontLaw::label).collect(Collectors.joining(", "))));
    }
}
