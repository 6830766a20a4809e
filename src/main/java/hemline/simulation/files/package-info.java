/**
 * Writes sweeps in the open formats: CfRadial 1.4 as netCDF-3 classic and as netCDF-4 (HDF5), and ODIM_H5 2.2; and truth
 * as JSON. The same sweep always gives the same bytes, on any platform.
 *
 * <p>May use: simulation.radar, boundary, sweep and their base; NetCDF-Java, jHDF and Jackson.
 * Open {@link hemline.simulation.files.SweepWriter} first.
 */
package hemline.simulation.files;
