/**
 * Reads radar sweeps in the open formats, each behind one interface, and joins files to a loop. What cannot be read
 * is refused by a typed fault that names file, place, what is wrong and what to do; no exception of a library, no
 * printing and no file beside the input gets out. The only user of the format libraries for reading.
 *
 * <p>May use: sweep and its base; NetCDF-Java (netCDF-3), jHDF (HDF5, netCDF-4), Commons Compress (bzip2, compress).
 * Open {@link hemline.reader.LoopOpener} first for loops, {@link hemline.reader.RadarFiles} for one file.
 * {@code docs/formats.md} lists formats, quirks and limits.
 *
 * <p>Follows: Dixon and Lee, CfRadial data file format, NCAR/EOL; OPERA Data Information Model for HDF5, EUMETNET;
 * Interface Control Documents 2620002 (RDA/RPG) and 2620010 (Archive II/user) of the WSR-88D Radar Operations Center;
 * HDF5 File Format Specification, The HDF Group; NetCDF Classic Format Specification, Unidata.
 */
package hemline.reader;
