package hemline.reader;

/**
 * Stored numbers before any scaling, as the primitive array they came in.
 *
 * @param array    byte[], short[], int[], long[], float[] or double[]
 * @param unsigned whether integers are to be taken as unsigned
 */
record RawArray(Object array, boolean unsigned) {
    int length() {
        return java.lang.reflect.Array.getLength(array);
    }

    boolean isReal() {
        return array instanceof float[] || array instanceof double[];
    }

    /** The same bits taken as unsigned. */
    RawArray asUnsigned() {
        return new RawArray(array, true);
    }

    double at(int i) {
        if (array instanceof byte[] b) {
            return unsigned ? b[i] & 0xff : b[i];
        }
        if (array instanceof short[] s) {
            return unsigned ? s[i] & 0xffff : s[i];
        }
        if (array instanceof int[] n) {
            return unsigned ? n[i] & 0xffffffffL : n[i];
        }
        if (array instanceof long[] l) {
            return l[i];
        }
        if (array instanceof float[] f) {
            return f[i];
        }
        return ((double[]) array)[i];
    }

    double[] toDoubles() {
        double[] values = new double[length()];
        for (int i = 0; i < values.length; i++) {
            values[i] = at(i);
        }
        return values;
    }
}
