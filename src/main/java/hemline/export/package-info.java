/**
 * Tables, GeoJSON, pictures and the record of a run, each written whole or not at all, the same input giving the same
 * bytes.
 *
 * <p>May use: casefile, pipeline, boundary, sweep and their base; Jackson, Commons CSV and NetCDF-Java.
 * Open {@link hemline.export.ResultWriter} first. GeoJSON follows RFC 7946, CSV RFC 4180.
 */
package hemline.export;
