/**
 * Thin lines (ridges) and clear-air arcs (steps): screened sweeps to observed boundaries with their significance.
 *
 * <p>A sweep becomes a raster with weights; strips in all directions give an even and an odd part of the profile across;
 * both over the local noise are evidence; evidence at rest is taken away; what is left is stacked over the neighbouring
 * sweeps along trial motions; crests are traced, set onto the sweep's own line and cut where the sweep does not bear them
 * out.
 *
 * <p>May use: boundary, sweep and their base.
 * Open {@link hemline.detection.Detection} first.
 *
 * <p>Follows Knutsson and Westin (1993, Proc. CVPR) for missing data, Lindeberg (1998, IJCV 30:117) and Steger (1998,
 * IEEE PAMI 20:113) for lines, Reed, Gagliardi and Stotts (1988) for stacking along motions, Desolneux, Moisan and Morel (2000, IJCV 40:7) for significance.
 */
package hemline.detection;
