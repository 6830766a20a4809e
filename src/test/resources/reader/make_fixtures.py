#!/usr/bin/env python3
"""Makes the small files beside this script, with encodings that Java cannot easily write.

    python3 make_fixtures.py          (needs h5py and netCDF4)

All values are invented. The numbers the tests expect follow from the formulas here.
"""
import os

import h5py
import netCDF4
import numpy as np

HERE = os.path.dirname(os.path.abspath(__file__))
RAYS, GATES = 24, 10


def codes(rays=RAYS, gates=GATES):
    """Code of ray r, gate g: 1 + (7 r + 3 g) mod 200; gate 0 of ray 0 is nodata (255), gate 1 undetect (0)."""
    r, g = np.indices((rays, gates))
    c = 1 + (7 * r + 3 * g) % 200
    c[0, 0], c[0, 1] = 255, 0
    return c


def path(name):
    p = os.path.join(HERE, name)
    if os.path.exists(p):
        os.remove(p)
    return p


def odim_groups(f, elevation=0.5):
    f.attrs["Conventions"] = np.bytes_("ODIM_H5/V2_2")
    what, where, how = (f.require_group(n) for n in ("what", "where", "how"))
    what.attrs["object"] = np.bytes_("SCAN")
    what.attrs["date"] = np.bytes_("20200611")
    what.attrs["time"] = np.bytes_("120000")
    what.attrs["source"] = np.bytes_("NOD:xxabc")
    where.attrs.update(lat=52.5, lon=13.4, height=80.0)
    d = f.create_group("dataset1")
    w = d.create_group("what")
    for k, v in dict(product="SCAN", startdate="20200611", starttime="120000", enddate="20200611",
                     endtime="120024").items():
        w.attrs[k] = np.bytes_(v)
    d.create_group("where").attrs.update(elangle=elevation, nrays=RAYS, nbins=GATES, rstart=0.0, rscale=500.0,
                                         a1gate=0)
    m = d.create_group("data1")
    m.create_group("what").attrs.update(gain=0.5, offset=-32.0, nodata=255.0, undetect=0.0)
    m["what"].attrs["quantity"] = np.bytes_("DBZH")
    return m


def odim(name, fill, **kw):
    with h5py.File(path(name), "w", **kw) as f:
        fill(f, odim_groups(f))


def strings(f, m):
    """Text in every way HDF5 can hold it; more than eight attributes, so that they are stored densely."""
    m.create_dataset("data", data=codes().astype("u1"))
    # Latin-1 bytes in a string declared ASCII, null-padded and longer than the text.
    f["what"].attrs.create("source", np.frombuffer(b"WMO:02606,PLC:\xc4ngelholm\0\0\0\0", dtype="S27")[0], dtype="S27")
    t = h5py.h5t.C_S1.copy()
    t.set_size(16)
    t.set_strpad(h5py.h5t.STR_SPACEPAD)
    del f["dataset1/data1/what"].attrs["quantity"]
    a = h5py.h5a.create(f["dataset1/data1/what"].id, b"quantity", t, h5py.h5s.create(h5py.h5s.SCALAR))
    a.write(np.array(b"DBZH            ", dtype="S16"))
    f["dataset1/what"].attrs["starttime"] = "120000"                         # variable length, UTF-8
    f["dataset1/what"].attrs["startdate"] = np.array([b"20200611"])          # array of one
    f["dataset1/where"].attrs["elangle"] = np.array([0.5], dtype="f4")
    f["dataset1/where"].attrs["rscale"] = np.array([[500.0]])
    f["dataset1/where"].attrs["nrays"] = np.array([RAYS], dtype=">i8")
    for i in range(20):
        f["how"].attrs["note%02d" % i] = "f\u00fcller %d" % i
    f["how"].attrs["beamwidth"] = "0.9"


def heap_of_four_byte_lengths():
    """A file with 4-byte offsets and lengths, whose heap of texts is aligned to 8 bytes."""
    plist = h5py.h5p.create(h5py.h5p.FILE_CREATE)
    plist.set_sizes(4, 4)
    fid = h5py.h5f.create(path("odim_heap4.h5").encode(), h5py.h5f.ACC_TRUNC, plist)
    with h5py.File(fid) as f:
        m = odim_groups(f)
        m.create_dataset("data", data=codes().astype("u1"), chunks=(RAYS, GATES), compression="gzip")
        f["what"].attrs["source"] = "WMO:02334,PLC:Hudiksvall,NOD:sehuv"
        f["dataset1/what"].attrs["starttime"] = "120000"


def storage(f):
    """One array in many storages. Value of row i, column j: (37 i + 11 j) mod 251, plus 1000 in wide types."""
    i, j = np.indices((23, 17))
    small = ((37 * i + 11 * j) % 251).astype("u1")
    wide = small.astype("i2") + 1000
    f.create_dataset("contiguous", data=small)
    f.create_dataset("big_endian", data=wide.astype(">i2"))
    f.create_dataset("chunked", data=small, chunks=(5, 4))
    f.create_dataset("gzip", data=small, chunks=(5, 4), compression="gzip")
    f.create_dataset("shuffle_gzip", data=wide, chunks=(7, 17), compression="gzip", shuffle=True)
    f.create_dataset("fletcher", data=wide, chunks=(7, 5), fletcher32=True)
    f.create_dataset("shuffle_gzip_fletcher", data=wide.astype("f4"), chunks=(6, 6), compression="gzip", shuffle=True,
                     fletcher32=True)
    f.create_dataset("single_chunk", data=small, chunks=(23, 17), compression="gzip")
    f.create_dataset("unlimited_rows", data=small, chunks=(1, 17), maxshape=(None, 17), compression="gzip")
    f.create_dataset("unlimited_both", data=small, chunks=(4, 4), maxshape=(None, None), compression="gzip")
    f.create_dataset("double", data=wide.astype("f8"), chunks=(23, 3), compression="gzip")
    f.create_dataset("enum", data=(small % 2).astype(bool), chunks=(23, 17), compression="gzip")
    d = f.create_dataset("partly_written", (23, 17), "i2", chunks=(5, 17), compression="gzip", fillvalue=-7)
    d[10:15] = wide[10:15]
    f.create_dataset("never_written", (23, 17), ">i2", fillvalue=-7)
    f.create_dataset("never_written_chunked", (23, 17), ">f4", chunks=(5, 17), fillvalue=-7.5)
    # Deflate does not shrink this, so that HDF5 stores the chunk as it is and masks the filter.
    noise = np.random.RandomState(1).randint(0, 256, (32, 16)).astype("u1")
    f.create_dataset("masked", data=noise, chunks=(32, 16), compression="gzip")
    f.create_dataset("masked_plain", data=noise)
    dcpl = h5py.h5p.create(h5py.h5p.DATASET_CREATE)
    dcpl.set_layout(h5py.h5d.COMPACT)
    c = h5py.h5d.create(f.id, b"compact", h5py.h5t.NATIVE_UINT8, h5py.h5s.create_simple((23, 17)), dcpl)
    c.write(h5py.h5s.ALL, h5py.h5s.ALL, small)


def cfradial2(name, sweeps, time_name, extra):
    """Two sweeps in groups; DBZH of sweep s, ray r, gate g: s + r + g / 10."""
    with netCDF4.Dataset(path(name), "w") as d:
        d.Conventions = "Cf/Radial-2.0" if extra else "CF-1.8, WMO CF-1.0, ACDD-1.3"
        d.version = "2.0"
        d.instrument_name = "abc"
        for k, v in dict(latitude=52.5, longitude=13.4, altitude=80.0).items():
            d.createVariable(k, "f8", ())[...] = v
        if extra:
            d.createDimension("sweep", len(sweeps))
            d.createVariable("sweep_group_name", str, ("sweep",))[:] = np.array(sweeps, dtype=object)
            d.createVariable("sweep_fixed_angle", "f4", ("sweep",))[:] = [3.0, 0.5]
        for s, group in enumerate(sweeps):
            g = d.createGroup(group)
            g.createDimension(time_name, RAYS)
            g.createDimension("range", GATES - s)
            t = g.createVariable("time", "f8", (time_name,))
            t.units = "seconds since 2020-06-11T12:00:00Z"
            t[:] = 30 * s + np.arange(RAYS)
            g.createVariable("range", "f4", ("range",))[:] = 250.0 + 500 * np.arange(GATES - s)
            g.createVariable("azimuth", "f4", (time_name,))[:] = (7.5 + 15 * np.arange(RAYS)) % 360
            g.createVariable("elevation", "f4", (time_name,))[:] = [3.0, 0.5][s]
            if extra:
                g.createVariable("sweep_mode", str, ())[...] = np.array("azimuth_surveillance", dtype=object)
            r, gate = np.indices((RAYS, GATES - s))
            for field, std in (("ZDR", ""), ("DBZH", "radar_equivalent_reflectivity_factor_h")):
                v = g.createVariable(field, "i2", (time_name, "range"), zlib=True, fill_value=-32768)
                v.set_auto_maskandscale(False)
                v.scale_factor, v.add_offset, v.units = 0.1, 0.0, "dBZ"
                v.setncattr("_Undetect", np.int16(-32767))
                if std:
                    v.standard_name = std
                v[:] = 10 * (s + r) + gate
                v[0, 1] = -32767
                v[0, 2] = -32768


def cfradial1(name, fmt):
    """One sweep; DBZ of ray r, gate g: r + g / 10."""
    with netCDF4.Dataset(path(name), "w", format=fmt) as d:
        d.Conventions = "CF/Radial-1.4 instrument_parameters"
        d.instrument_name = "abc"
        d.createDimension("time", None)
        d.createDimension("range", GATES)
        d.createDimension("sweep", 1)
        for k, v in dict(latitude=52.5, longitude=13.4, altitude=80.0).items():
            d.createVariable(k, "f8", ())[...] = v
        t = d.createVariable("time", "f8", ("time",))
        t.units = "seconds since 2020-06-11 12:00:00 0:00"
        t[:] = np.arange(RAYS)
        d.createVariable("range", "f4", ("range",))[:] = 250.0 + 500 * np.arange(GATES)
        d.createVariable("azimuth", "f4", ("time",))[:] = (7.5 + 15 * np.arange(RAYS)) % 360
        d.createVariable("elevation", "f4", ("time",))[:] = 0.5
        d.createVariable("sweep_start_ray_index", "i4", ("sweep",))[:] = 0
        d.createVariable("sweep_end_ray_index", "i4", ("sweep",))[:] = RAYS - 1
        r, g = np.indices((RAYS, GATES))
        v = d.createVariable("DBZ", "i2", ("time", "range"), fill_value=-32768)
        v.set_auto_maskandscale(False)
        v.scale_factor, v.add_offset, v.standard_name = 0.1, 0.0, "equivalent_reflectivity_factor"
        v[:] = 10 * r + g
        if fmt == "NETCDF4":
            d.createVariable("sweep_mode", str, ("sweep",))[:] = np.array(["azimuth_surveillance  "], dtype=object)


odim("odim_strings.h5", strings, libver="latest", track_order=True)
heap_of_four_byte_lengths()
odim("odim_lzf.h5", lambda f, m: m.create_dataset("data", data=codes().astype("u1"), chunks=(RAYS, GATES),
                                                  compression="lzf"))
odim("odim_scaleoffset.h5", lambda f, m: m.create_dataset("data", data=codes().astype("u1"), chunks=(RAYS, GATES),
                                                          scaleoffset=8))
odim("odim_userblock.h5", lambda f, m: m.create_dataset("data", data=codes().astype("u1"), chunks=(6, 10),
                                                        compression="gzip", fletcher32=True), userblock_size=512)
for version in ("earliest", "latest"):
    with h5py.File(path("storage_%s.h5" % version), "w", libver=version) as f:
        storage(f)
cfradial2("cfradial2_sweep_0.nc", ["sweep_0", "sweep_1"], "time", True)
cfradial2("cfradial2_sweep_0000.nc", ["sweep_0000", "sweep_0001"], "azimuth", False)
for fmt, name in (("NETCDF4", "cf4"), ("NETCDF3_CLASSIC", "cdf1"), ("NETCDF3_64BIT_OFFSET", "cdf2"),
                  ("NETCDF3_64BIT_DATA", "cdf5")):
    cfradial1("cfradial1_%s.nc" % name, fmt)
