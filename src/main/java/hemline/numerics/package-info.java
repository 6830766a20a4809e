/**
 * Filters, smoothers, assignment, least squares and robust statistics on plain arrays. No radar word occurs here.
 *
 * <p>Following and smoothing: {@link hemline.numerics.ConstantVelocity} over {@link hemline.numerics.KalmanFilter}
 * and {@link hemline.numerics.RtsSmoother}. Pairing: {@link hemline.numerics.Assignment}. Fits:
 * {@link hemline.numerics.LinearFit} (well conditioned), {@link hemline.numerics.NormalEquations} (fast, small),
 * {@link hemline.numerics.NonlinearFit}. Threads: {@link hemline.numerics.Workers}.
 *
 * <p>May use: nothing of Hemline; Apache Commons Math and EJML.
 * Open {@link hemline.numerics.KalmanFilter} first.
 */
package hemline.numerics;
