package hemline.checks;

import hemline.checks.OutsideCheck.Basis;
import java.util.ArrayList;
import java.util.List;
import java.util.function.DoubleSupplier;

/** Gathers the checks of one part. */
public final class CheckList {
    private final String part;
    private final List<OutsideCheck> checks = new ArrayList<>();

    public CheckList(String part) {
        this.part = part;
    }

    /** Checks that follow are from this source. */
    public Sourced from(Basis basis, String source) {
        return new Sourced(basis, source);
    }

    public List<OutsideCheck> checks() {
        return List.copyOf(checks);
    }

    /** Adds checks that share a source. */
    public final class Sourced {
        private final Basis basis;
        private final String source;

        private Sourced(Basis basis, String source) {
            this.basis = basis;
            this.source = source;
        }

        /**
         * @param expected  as the source prints it
         * @param tolerance absolute
         */
        public Sourced check(String quantity, String inputs, String expected, double tolerance, DoubleSupplier got) {
            checks.add(new OutsideCheck(part, quantity, inputs, expected, tolerance, source, basis, got));
            return this;
        }
    }
}
