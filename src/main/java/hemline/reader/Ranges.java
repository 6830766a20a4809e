package hemline.reader;

/**
 * Where the gates of a ray are.
 *
 * @param firstCentreM slant range of the centre of gate 0, m
 * @param spacingM     gate length, m
 * @param gates        number of gates
 */
record Ranges(double firstCentreM, double spacingM, int gates) {
    double centreM(int gate) {
        return firstCentreM + gate * spacingM;
    }
}
