"""Makes base-lines.bin.gz from the TopoJSON of the npm packages world-atlas 2.0.2 (Natural Earth 1:10m, public domain)
and us-atlas 3.0.1 (U.S. Census Bureau cartographic boundaries, public domain).

usage: make-base-lines.py countries-10m.json states-10m.json base-lines.bin.gz
Lines are the topology's arcs, each once, thinned to TOLERANCE degrees; numbers are in 1e-4 degrees.
Form: for each line a kind byte (1 coast, 2 border, 3 state border), the number of points, then longitude and latitude
differences from point to point (the first from 0), all as zigzag variable-length integers; 0 ends the file.
"""
import gzip, json, math, sys

TOLERANCE = 0.002


def decode(topology):
    sx, sy = topology['transform']['scale']
    tx, ty = topology['transform']['translate']
    for arc in topology['arcs']:
        x = y = 0
        points = []
        for dx, dy in arc:
            x += dx
            y += dy
            points.append((x * sx + tx, y * sy + ty))
        yield points


def uses(topology, name):
    count = [0] * len(topology['arcs'])

    def walk(arcs):
        for a in arcs:
            if isinstance(a, list):
                walk(a)
            else:
                count[a if a >= 0 else ~a] += 1
    for geometry in topology['objects'][name]['geometries']:
        walk(geometry.get('arcs', []))
    return count


def thin(points):
    """Douglas and Peucker (1973)."""
    if len(points) < 3:
        return points
    keep = {0, len(points) - 1}
    stack = [(0, len(points) - 1)]
    while stack:
        a, b = stack.pop()
        (x0, y0), (x1, y1) = points[a], points[b]
        squeeze = math.cos(math.radians((y0 + y1) / 2))
        best, where = 0, None
        ux, uy = (x1 - x0) * squeeze, y1 - y0
        length = math.hypot(ux, uy)
        for i in range(a + 1, b):
            vx, vy = (points[i][0] - x0) * squeeze, points[i][1] - y0
            d = math.hypot(vx, vy) if length < 1e-12 else abs(ux * vy - uy * vx) / length
            if d > best:
                best, where = d, i
        if best > TOLERANCE:
            keep.add(where)
            stack += [(a, where), (where, b)]
    return [points[i] for i in sorted(keep)]


def varint(out, value):
    value = value << 1 if value >= 0 else (-value << 1) - 1
    while value > 127:
        out.append(value & 127 | 128)
        value >>= 7
    out.append(value)


def write(out, kind, points):
    points = [(round(x * 1e4), round(y * 1e4)) for x, y in thin(points)]
    points = [p for i, p in enumerate(points) if i == 0 or p != points[i - 1]]
    if len(points) < 2:
        return 0
    out.append(kind)
    varint(out, len(points))
    px = py = 0
    for x, y in points:
        varint(out, x - px)
        varint(out, y - py)
        px, py = x, y
    return len(points)


def main(countries, states, target):
    out = bytearray()
    total = 0
    topology = json.load(open(countries))
    count = uses(topology, 'countries')
    for points, n in zip(decode(topology), count):
        if n:
            total += write(out, 1 if n == 1 else 2, points)
    topology = json.load(open(states))
    count = uses(topology, 'states')
    for points, n in zip(decode(topology), count):
        if n > 1:
            total += write(out, 3, points)
    out.append(0)
    with open(target, 'wb') as raw, gzip.GzipFile(filename='', mode='wb', fileobj=raw, mtime=0) as zipped:
        zipped.write(bytes(out))
    print(total, 'points')


main(*sys.argv[1:])
