#!/usr/bin/python3
# SPDX-License-Identifier: Apache-2.0
"""Reads every snapshot of a run with VTK's own readers and fails on the first thing that is wrong.

usage: check-vtk.py RUN_FOLDER        (Debian: apt-get install python3-vtk9 python3-numpy; run with /usr/bin/python3)

Checked for each file that the index names: no error event of the reader (a damaged file gives one, while the reader's
error code stays 0), the counts of points and cells agree with the XML, the expected arrays are there and finite,
cells name existing points, radii are positive, the appended arrays lie back to back, the time in the file is the time
in the index, and every time has the same parts.
Exit status: 0 all well, 1 something wrong, 2 wrong use.
"""
import re
import sys
import xml.etree.ElementTree as ElementTree
from pathlib import Path

from vtkmodules.util.numpy_support import vtk_to_numpy
from vtkmodules.vtkIOXML import vtkXMLPolyDataReader, vtkXMLUnstructuredGridReader
import numpy

READERS = {".vtp": vtkXMLPolyDataReader, ".vtu": vtkXMLUnstructuredGridReader}
GRAIN_ARRAYS = {"radius", "velocity", "lot", "id"}
POINT_ARRAYS = {"displacement"}
CELL_ARRAYS = {"axial force", "bending moment", "max fibre stress"}


class Wrong(Exception):
    """Something in the run folder is not as it must be."""


def require(holds, message):
    if not holds:
        raise Wrong(message)


def read(path):
    """The data set of a file; any error event of the reader counts."""
    events = []
    reader = READERS[path.suffix]()
    reader.AddObserver("ErrorEvent", lambda caller, event: events.append(event))
    reader.SetFileName(str(path))
    reader.Update()
    require(not events, f"{path}: VTK's reader reports {len(events)} error(s)")
    return reader.GetOutput()


def check_layout(path):
    """Raw arrays lie back to back, each behind its length; returns the points and cells that the XML part declares."""
    head, body = path.read_bytes().split(b'<AppendedData encoding="raw">\n_', 1)
    end = 0
    for offset in (int(text) for text in re.findall(rb'offset="(\d+)"', head)):
        require(offset == end, f"{path}: an array begins at {offset}, the one before ends at {end}")
        end = offset + 8 + int.from_bytes(body[offset : offset + 8], "little")
    require(body[end:] == b"\n</AppendedData>\n</VTKFile>\n", f"{path}: the appended data do not end at {end}")
    piece = re.search(rb"<Piece ([^>]*)>", head)
    require(piece, f"{path}: no Piece")
    number = {name: int(count) for name, count in re.findall(rb'NumberOf(\w+)="(\d+)"', piece.group(1))}
    return number[b"Points"], sum(count for name, count in number.items() if name != b"Points")


def arrays(attributes):
    """Arrays by name without the unit in brackets."""
    return {
        re.sub(r" \[.*\]$", "", attributes.GetArrayName(i)): attributes.GetArray(i)
        for i in range(attributes.GetNumberOfArrays())
    }


def require_arrays(path, where, found, expected, tuples):
    missing = sorted(expected - found.keys())
    require(not missing, f"{path}: {where} lacks {missing}, has {sorted(found)}")
    for name, array in found.items():
        require(array.GetNumberOfTuples() == tuples, f"{path}: {name} has {array.GetNumberOfTuples()} tuples, expected {tuples}")
        require(numpy.isfinite(vtk_to_numpy(array)).all(), f"{path}: {name} has values that are not finite")
        require(name != "radius" or (vtk_to_numpy(array) > 0).all(), f"{path}: a radius is not positive")


def check_cells(path, cells, points):
    if cells.GetNumberOfCells():
        named = vtk_to_numpy(cells.GetConnectivityArray())
        require(0 <= named.min() and named.max() < points, f"{path}: cells name points {named.min()} to {named.max()} of {points}")


def check_file(path, time):
    """Checks one file and returns its numbers of points and cells."""
    data = read(path)
    points, cells = data.GetNumberOfPoints(), data.GetNumberOfCells()
    declared = check_layout(path)
    require((points, cells) == declared, f"{path}: {points} points and {cells} cells, XML says {declared}")
    field = data.GetFieldData().GetArray("TimeValue")
    require(field is not None and field.GetValue(0) == time, f"{path}: TimeValue is not the {time} s of the index")
    if points:
        require(numpy.isfinite(vtk_to_numpy(data.GetPoints().GetData())).all(), f"{path}: positions that are not finite")
    grains = path.suffix == ".vtp"
    check_cells(path, data.GetVerts() if grains else data.GetCells(), points)
    require_arrays(path, "PointData", arrays(data.GetPointData()), GRAIN_ARRAYS if grains else POINT_ARRAYS, points)
    require_arrays(path, "CellData", arrays(data.GetCellData()), set() if grains else CELL_ARRAYS, cells)
    return points, cells


def the_index(folder):
    found = sorted(folder.glob("*.pvd"))
    require(len(found) == 1, f"{folder}: {len(found)} .pvd files, expected 1")
    return found[0]


def check_run(folder):
    index = the_index(folder)
    sets = ElementTree.parse(index).getroot().findall("Collection/DataSet")
    require(sets, f"{index}: names no files")
    parts, listed, largest = {}, set(), {}
    for entry in sets:
        path, time, name = folder / entry.get("file"), float(entry.get("timestep")), entry.get("name")
        parts.setdefault(time, []).append(name)
        require(path.is_file(), f"{index}: names {path.name}, which is not there")
        listed.add(path)
        counts = check_file(path, time)
        largest[name] = max(largest.get(name, (0, 0)), counts)
    require(list(parts) == sorted(parts), f"{index}: times are not in order")
    require(len({tuple(names) for names in parts.values()}) == 1, f"{index}: not the same parts at every time")
    # a killed run may leave files of the one frame that its index did not come to name
    cut_short = f"_{1 + max(int(p.stem.rsplit('_', 1)[1]) for p in listed):06d}"
    unlisted = {p for p in folder.rglob("*.vt[pu]") if not p.stem.endswith(cut_short)} - listed
    require(not unlisted, f"{index}: does not name {sorted(p.name for p in unlisted)}")
    sizes = ", ".join(f"{name} {points} points {cells} cells" for name, (points, cells) in largest.items())
    print(f"{index}: {len(parts)} times from {min(parts):g} s to {max(parts):g} s, {len(listed)} files read without error; {sizes}")


def main():
    if len(sys.argv) != 2:
        print(__doc__, file=sys.stderr)
        return 2
    try:
        check_run(Path(sys.argv[1]))
    except (Wrong, ElementTree.ParseError) as wrong:
        print(f"check-vtk: {wrong}", file=sys.stderr)
        return 1
    return 0


if __name__ == "__main__":
    sys.exit(main())
