package hemline.checks;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.stream.Collectors;

/** The page docs/checks.md. */
final class ChecksPage {

    private ChecksPage() {
    }

    static String of(List<OutsideCheck> checks) {
        Map<String, List<OutsideCheck>> parts = checks.stream()
                .collect(Collectors.groupingBy(OutsideCheck::part, LinkedHashMap::new, Collectors.toList()));
        StringBuilder page = new StringBuilder("# Checks against the outside\n\n"
                + "Values from published standards, papers, handbook tables and the public tests of general-purpose "
                + "libraries that the code has to reproduce. This page is made from the tests "
                + "(`OutsideChecksTest`), which fail when a value is off or the page is stale.\n\n"
                + "Tolerances are absolute, in the unit of the quantity. The letter says how the expected value came "
                + "here:\n\n");
        for (OutsideCheck.Basis basis : OutsideCheck.Basis.values()) {
            long n = checks.stream().filter(check -> check.basis() == basis).count();
            page.append("- **").append(letter(basis)).append("** ").append(basis.words()).append(" (").append(n)
                    .append(")\n");
        }
        page.append("\n").append(checks.size()).append(" checks.\n");
        int number = 0;
        for (Map.Entry<String, List<OutsideCheck>> part : parts.entrySet()) {
            page.append("\n## ").append(part.getKey()).append("\n\n")
                    .append("| # | quantity | inputs | expected | got | tolerance | source | |\n")
                    .append("| ---: | --- | --- | ---: | ---: | ---: | --- | --- |\n");
            for (OutsideCheck check : part.getValue()) {
                number++;
                page.append("| ").append(String.join(" | ", Integer.toString(number), check.quantity(), check.inputs(),
                        check.expected(), check.gotText(), check.toleranceText(), check.source(),
                        letter(check.basis()))).append(" |\n");
            }
        }
        return page.toString();
    }

    private static String letter(OutsideCheck.Basis basis) {
        return basis.name().substring(0, 1);
    }
}
