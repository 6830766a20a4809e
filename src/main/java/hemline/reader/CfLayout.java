package hemline.reader;

import hemline.sweep.Field;
import java.util.Arrays;

/**
 * Where the rays of a sweep lie in the arrays of its fields.
 *
 * @param rows      rows of the rays, in the order of the file
 * @param gates     gates of the sweep
 * @param rayStart  for ragged fields, index of each row's first point; null for fields with two dimensions
 * @param rayGates  for ragged fields, each row's number of gates; null otherwise
 */
record CfLayout(int[] rows, int gates, long[] rayStart, int[] rayGates) {

    boolean isRagged() {
        return rayStart != null;
    }

    /** Values {@code [ray][gate]} of one field. */
    float[] read(InputFile file, ArrayVariable variable) throws UnreadableFileException {
        return isRagged() ? readRagged(file, variable) : readPlain(file, variable);
    }

    private float[] readPlain(InputFile file, ArrayVariable variable) throws UnreadableFileException {
        int from = rows[0];
        int past = rows[rows.length - 1] + 1;
        Limits.checkSweep(file, variable.path(), past - from, gates);
        float[] block = CfPacking.decode(file, variable.path(), variable.rows(from, past - from),
                variable.attributes());
        if (past - from == rows.length) {
            return block;
        }
        float[] picked = new float[rows.length * gates];
        for (int i = 0; i < rows.length; i++) {
            System.arraycopy(block, (rows[i] - from) * gates, picked, i * gates, gates);
        }
        return picked;
    }

    private float[] readRagged(InputFile file, ArrayVariable variable) throws UnreadableFileException {
        long from = Long.MAX_VALUE;
        long past = 0;
        for (int row : rows) {
            from = Math.min(from, rayStart[row]);
            past = Math.max(past, rayStart[row] + rayGates[row]);
        }
        if (from < 0 || past > variable.shape()[0] || past - from > Limits.MAX_CELLS) {
            throw file.broken(variable.path(), "has " + variable.shape()[0] + " points, the rays' indices reach "
                    + past);
        }
        float[] block = CfPacking.decode(file, variable.path(), variable.rows((int) from, (int) (past - from)),
                variable.attributes());
        float[] values = new float[rows.length * gates];
        Arrays.fill(values, Field.NOT_MEASURED);
        for (int i = 0; i < rows.length; i++) {
            int row = rows[i];
            System.arraycopy(block, (int) (rayStart[row] - from), values, i * gates, Math.min(gates, rayGates[row]));
        }
        return values;
    }
}
