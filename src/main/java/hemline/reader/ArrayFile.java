package hemline.reader;

/** A self-describing file of arrays in groups: HDF5, netCDF-4 or netCDF-3. */
interface ArrayFile extends AutoCloseable {
    /** The container in words: {@code netCDF-3}, {@code HDF5}. */
    String container();

    ArrayGroup root();

    @Override
    void close();
}
