/**
 * Density-current theory, moist-air thermodynamics, and what stations saw when a boundary passed over them.
 *
 * <p>May use: boundary, sweep and their base.
 * Open {@link hemline.outflow.OutflowTheory} first: it tells all that follows from given observations.
 * Bolton (1980) for moist air; von Kármán (1940), Benjamin (1968), Huppert and Simpson (1980), Simpson and Britter
 * (1980) and Hoult (1972) for fronts and spreading.
 */
package hemline.outflow;
