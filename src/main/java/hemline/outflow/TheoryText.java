package hemline.outflow;

import hemline.numerics.Estimate;
import java.util.List;
import java.util.Locale;

/** What theory says, as aligned text. */
public final class TheoryText {

    private TheoryText() {
    }

    /** One line a finding, then the comparison, what is needed for more, and cautions; lines end in a line feed. */
    public static String of(TheoryResult result) {
        List<Finding> findings = result.findings();
        int words = findings.stream().mapToInt(f -> f.words().length()).max().orElse(0);
        int numbers = findings.stream().mapToInt(f -> number(f.estimate()).length()).max().orElse(0);
        int units = findings.stream().mapToInt(f -> f.unit().length()).max().orElse(0);
        StringBuilder text = new StringBuilder();
        for (Finding finding : findings) {
            String number = number(finding.estimate());
            text.append(finding.words()).append(" ".repeat(words - finding.words().length() + 2))
                    .append(" ".repeat(numbers - number.length())).append(number).append("  ").append(finding.unit())
                    .append(" ".repeat(units - finding.unit().length())).append("  from ").append(finding.from())
                    .append('\n');
        }
        if (!result.comparison().isEmpty()) {
            text.append(result.comparison()).append('\n');
        }
        result.needs().forEach(need -> text.append("would need: ").append(need).append('\n'));
        result.cautions().forEach(caution -> text.append("caution: ").append(caution).append('\n'));
        return text.toString();
    }

    /** With as many decimals as the standard deviation's second digit has. */
    private static String number(Estimate estimate) {
        double scale = estimate.sd() > 0 ? estimate.sd() : Math.abs(estimate.value()) / 1000;
        int decimals = scale > 0 ? Math.max(0, Math.min(6, 1 - (int) Math.floor(Math.log10(scale)))) : 0;
        String form = "%." + decimals + "f";
        return String.format(Locale.ROOT, form + " +- " + form, estimate.value(), estimate.sd());
    }
}
