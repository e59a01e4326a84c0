#!/usr/bin/python3
# SPDX-License-Identifier: Apache-2.0
"""Draws one snapshot of a run, looking obliquely along the deck, without a screen.

usage: render-deck.py RUN_FOLDER OUT.png [FRAME]
       FRAME counts from 0; negative counts from the end; the last one if left out
       (Debian: apt-get install python3-vtk9 python3-numpy xvfb xauth; starts itself again under xvfb-run where there is no display)

Grains are spheres of their own radius coloured by lot; wires are tubes of their mean radius, shaded from steel blue
(smallest axial force of the frame) to dark (largest). The view takes in the structures and the grains above them.
"""
import os
import re
import shutil
import sys
import xml.etree.ElementTree as ElementTree
from pathlib import Path

if not os.environ.get("DISPLAY") and shutil.which("xvfb-run"):
    os.execvp("xvfb-run", ["xvfb-run", "-a", sys.executable, *sys.argv])

import numpy
import vtk
from vtk.util.numpy_support import vtk_to_numpy

INK = (0.13, 0.15, 0.18)
# lots in two well separated hues of equal weight (also for colour-blind readers), then a few more
LOT_COLOURS = [(0.90, 0.62, 0.10), (0.00, 0.45, 0.60), (0.45, 0.60, 0.25), (0.70, 0.35, 0.55)]
WIRE_LOW, WIRE_HIGH = (0.62, 0.71, 0.80), (0.10, 0.16, 0.28)
SIZE = (1600, 900)
DEFAULT_WIRE_RADIUS = 0.001


def bare(name):
    return re.sub(r" \[.*\]$", "", name)


def find(attributes, wanted):
    """Full name of the array whose name without unit is the wanted one, or None."""
    names = (attributes.GetArrayName(i) for i in range(attributes.GetNumberOfArrays()))
    return next((name for name in names if bare(name) == wanted), None)


def read(path):
    reader = vtk.vtkXMLPolyDataReader() if path.suffix == ".vtp" else vtk.vtkXMLUnstructuredGridReader()
    failures = []
    reader.AddObserver("ErrorEvent", lambda caller, event: failures.append(event))
    reader.SetFileName(str(path))
    reader.Update()
    if failures:
        sys.exit(f"render-deck: {path} cannot be read")
    return reader.GetOutput()


def frame(folder, number):
    index = sorted(folder.glob("*.pvd"))
    if not index:
        sys.exit(f"render-deck: no .pvd in {folder}")
    sets = ElementTree.parse(index[0]).getroot().findall("Collection/DataSet")
    times = sorted({float(entry.get("timestep")) for entry in sets})
    if not -len(times) <= number < len(times):
        sys.exit(f"render-deck: frame {number} of {len(times)}")
    time = times[number]
    return time, [read(folder / entry.get("file")) for entry in sets if float(entry.get("timestep")) == time]


def lots_of(grains):
    name = find(grains.GetPointData(), "lot")
    return name, sorted({int(lot) for lot in vtk_to_numpy(grains.GetPointData().GetArray(name))}) if name else [0]


def grain_actor(grains):
    """Spheres of radius 1 scaled by the radius and coloured by lot."""
    sphere = vtk.vtkSphereSource()
    sphere.SetRadius(1.0)
    sphere.SetThetaResolution(20)
    sphere.SetPhiResolution(14)
    mapper = vtk.vtkGlyph3DMapper()
    mapper.SetInputData(grains)
    mapper.SetSourceConnection(sphere.GetOutputPort())
    mapper.SetScaleArray(find(grains.GetPointData(), "radius"))
    mapper.SetScaleModeToScaleByMagnitude()
    mapper.SetScaleFactor(1.0)
    name, lots = lots_of(grains)
    if name:
        table = vtk.vtkLookupTable()
        table.SetNumberOfTableValues(max(lots) + 1)
        for lot in range(max(lots) + 1):
            table.SetTableValue(lot, *LOT_COLOURS[lot % len(LOT_COLOURS)], 1.0)
        table.SetTableRange(-0.5, max(lots) + 0.5)
        mapper.SetLookupTable(table)
        mapper.UseLookupTableScalarRangeOn()
        mapper.SetScalarModeToUsePointFieldData()
        mapper.SelectColorArray(name)
    else:
        mapper.ScalarVisibilityOff()
    actor = vtk.vtkActor()
    actor.SetMapper(mapper)
    actor.GetProperty().SetColor(*LOT_COLOURS[0])
    actor.GetProperty().SetSpecular(0.25)
    actor.GetProperty().SetSpecularPower(30)
    return actor


def wire_actor(mesh):
    """Tubes of the elements' mean radius; returns the actor and the map of axial force to colour (None without that array)."""
    surface = vtk.vtkDataSetSurfaceFilter()
    surface.SetInputData(mesh)
    radius = find(mesh.GetCellData(), "radius")
    tube = vtk.vtkTubeFilter()
    tube.SetInputConnection(surface.GetOutputPort())
    tube.SetRadius(float(vtk_to_numpy(mesh.GetCellData().GetArray(radius)).mean()) if radius else DEFAULT_WIRE_RADIUS)
    tube.SetNumberOfSides(12)
    tube.CappingOn()
    mapper = vtk.vtkPolyDataMapper()
    mapper.SetInputConnection(tube.GetOutputPort())
    force, ramp = find(mesh.GetCellData(), "axial force"), None
    if force:
        low, high = mesh.GetCellData().GetArray(force).GetRange()
        ramp = vtk.vtkColorTransferFunction()
        ramp.AddRGBPoint(low, *WIRE_LOW)
        ramp.AddRGBPoint(high if high > low else low + 1.0, *WIRE_HIGH)
        mapper.SetScalarModeToUseCellFieldData()
        mapper.SelectColorArray(force)
        mapper.SetLookupTable(ramp)
    else:
        mapper.ScalarVisibilityOff()
    actor = vtk.vtkActor()
    actor.SetMapper(mapper)
    actor.GetProperty().SetColor(*WIRE_LOW)
    actor.GetProperty().SetSpecular(0.4)
    actor.GetProperty().SetSpecularPower(40)
    return actor, ramp, force


def text(content, x, y, size):
    actor = vtk.vtkTextActor()
    actor.SetInput(content)
    actor.GetTextProperty().SetFontSize(size)
    actor.GetTextProperty().SetColor(*INK)
    actor.SetPosition(x, y)
    return actor


def dot(x, y, colour):
    disk = vtk.vtkRegularPolygonSource()
    disk.SetNumberOfSides(40)
    disk.SetRadius(11)
    mapper = vtk.vtkPolyDataMapper2D()
    mapper.SetInputConnection(disk.GetOutputPort())
    actor = vtk.vtkActor2D()
    actor.SetMapper(mapper)
    actor.GetProperty().SetColor(*colour)
    actor.SetPosition(x, y)
    return actor


def lot_legend(renderer, grains):
    """A coloured dot and a line of text for each lot, top left."""
    name, lots = lots_of(grains)
    numbers = vtk_to_numpy(grains.GetPointData().GetArray(name)) if name else numpy.zeros(grains.GetNumberOfPoints())
    for row, lot in enumerate(lots):
        y = SIZE[1] - 130 - 38 * row
        renderer.AddActor2D(dot(52, y + 14, LOT_COLOURS[lot % len(LOT_COLOURS)]))
        renderer.AddActor2D(text(f"lot {lot}   {int((numbers == lot).sum())} grains", 76, y + 3, 24))


def force_legend(renderer, ramp, name):
    bar = vtk.vtkScalarBarActor()
    bar.SetLookupTable(ramp)
    bar.SetNumberOfLabels(3)
    bar.SetLabelFormat("%.3g")
    bar.SetOrientationToHorizontal()
    bar.SetPosition(0.70, 0.03)
    bar.SetWidth(0.26)
    bar.SetHeight(0.09)
    bar.UnconstrainedFontSizeOn()
    label = bar.GetLabelTextProperty()
    label.SetColor(*INK)
    label.SetFontSize(22)
    label.BoldOff()
    label.ItalicOff()
    label.ShadowOff()
    renderer.AddActor2D(bar)
    renderer.AddActor2D(text(f"wires: {name}", int(0.70 * SIZE[0]), int(0.13 * SIZE[1]), 24))


def box(data_sets):
    """Bounds of the structures, raised to the top of nearly all grains; fallen grains must not shrink the picture."""
    filled = [data for data in data_sets if data.GetNumberOfPoints()]
    points = [vtk_to_numpy(data.GetPoints().GetData()) for data in filled]
    if not points:
        sys.exit("render-deck: the frame is empty")
    structures = [xyz for data, xyz in zip(filled, points) if not isinstance(data, vtk.vtkPolyData)]
    xyz = numpy.vstack(structures or points)
    low, high = xyz.min(axis=0), xyz.max(axis=0)
    high[2] = max([high[2]] + [numpy.percentile(each[:, 2], 95) for each in points])
    return low, high


def aim(renderer, data_sets):
    """Looks obliquely along the longer horizontal side of the scene, z up, and fills the picture."""
    low, high = box(data_sets)
    centre, extent = 0.5 * (low + high), high - low
    along = numpy.array([1.0, 0.0, 0.0] if extent[0] >= extent[1] else [0.0, 1.0, 0.0])
    across = numpy.array([along[1], -along[0], 0.0])
    view = -along + 0.45 * across + numpy.array([0.0, 0.0, 0.62])
    camera = renderer.GetActiveCamera()
    camera.SetFocalPoint(*centre)
    camera.SetPosition(*(centre + view * numpy.linalg.norm(extent)))
    camera.SetViewUp(0, 0, 1)
    camera.SetViewAngle(28)
    renderer.ResetCamera(*numpy.ravel(numpy.column_stack([low, high])))
    camera.Zoom(1.3)
    renderer.ResetCameraClippingRange()


def draw(time, data_sets, picture):
    renderer = vtk.vtkRenderer()
    renderer.SetBackground(1, 1, 1)
    for data in data_sets:
        if data.GetNumberOfPoints() == 0:
            continue
        if isinstance(data, vtk.vtkPolyData):
            renderer.AddActor(grain_actor(data))
            lot_legend(renderer, data)
        else:
            actor, ramp, force = wire_actor(data)
            renderer.AddActor(actor)
            if ramp:
                force_legend(renderer, ramp, force)
    renderer.AddActor2D(text(f"t = {time:.4f} s", 40, SIZE[1] - 75, 34))
    window = vtk.vtkRenderWindow()
    window.SetOffScreenRendering(1)
    window.SetMultiSamples(8)
    window.SetSize(*SIZE)
    window.AddRenderer(renderer)
    aim(renderer, data_sets)
    window.Render()
    grab = vtk.vtkWindowToImageFilter()
    grab.SetInput(window)
    grab.ReadFrontBufferOff()
    writer = vtk.vtkPNGWriter()
    writer.SetFileName(str(picture))
    writer.SetInputConnection(grab.GetOutputPort())
    writer.Write()


def main():
    if len(sys.argv) not in (3, 4):
        sys.exit(__doc__)
    number = int(sys.argv[3]) if len(sys.argv) == 4 else -1
    time, data_sets = frame(Path(sys.argv[1]), number)
    draw(time, data_sets, Path(sys.argv[2]))
    print(f"{sys.argv[2]}: t = {time:g} s")


if __name__ == "__main__":
    main()
