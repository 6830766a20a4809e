/**
 * Tables, GeoJSON, netCDF, pictures and the report.
 *
 * <p>May use: casefile, pipeline, boundary, sweep and their base.
 */
package hemline.export;
