package hemline.outflow;

import hemline.numerics.Estimate;
import java.util.List;

/**
 * What density-current theory says about the given observations.
 *
 * @param findings   every number that can be told, in order of reasoning
 * @param comparison observed against theoretical speed, in words; empty when either is missing
 * @param zScore     observed less theoretical speed over the standard deviation of the difference; NaN when either is
 *                   missing
 * @param needs      what could be told with more, in words
 * @param cautions   values outside what outflows have, assumptions made
 */
public record TheoryResult(List<Finding> findings, String comparison, double zScore, List<String> needs,
                           List<String> cautions) {
    public TheoryResult {
        findings = List.copyOf(findings);
        needs = List.copyOf(needs);
        cautions = List.copyOf(cautions);
    }

    /** The number under a key; unknown when it could not be told. */
    public Estimate get(String key) {
        return findings.stream().filter(finding -> finding.key().equals(key)).map(Finding::estimate).findFirst()
                .orElse(Estimate.UNKNOWN);
    }
}
