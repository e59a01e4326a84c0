// SPDX-License-Identifier: Apache-2.0
package reedling.vtk;

import reedling.output.SnapshotFrame;
import reedling.output.SnapshotFrame.GrainCloud;
import reedling.output.SnapshotFrame.LineMesh;

/** How grains and line meshes are laid out as VTK data sets. */
final class VtkLayout {

    /** VTK's number of a two-node line. */
    private static final int LINE = 3;

    private VtkLayout() {}

    /** Poly data with one vertex cell a grain, so that filters on cells work grain by grain. */
    static VtkDocument grains(SnapshotFrame frame) {
        GrainCloud grains = frame.grains();
        int count = grains.count();
        return new VtkDocument("PolyData", frame)
                .line("<Piece NumberOfPoints=\"" + count + "\" NumberOfVerts=\"" + count
                        + "\" NumberOfLines=\"0\" NumberOfStrips=\"0\" NumberOfPolys=\"0\">")
                .section("PointData", grains.fields())
                .points(grains.positions())
                .line("<Verts>")
                .array(VtkArray.sequence("connectivity", count, 0, 1))
                .array(VtkArray.sequence("offsets", count, 1, 1))
                .line("</Verts>")
                .line("</Piece>");
    }

    /** An unstructured grid of two-node lines; offsets are the end of each cell in the connectivity. */
    static VtkDocument lines(SnapshotFrame frame, LineMesh mesh) {
        int elements = mesh.elements();
        return new VtkDocument("UnstructuredGrid", frame)
                .line("<Piece NumberOfPoints=\"" + mesh.nodes() + "\" NumberOfCells=\"" + elements + "\">")
                .section("PointData", mesh.pointFields())
                .section("CellData", mesh.cellFields())
                .points(mesh.points())
                .line("<Cells>")
                .array(VtkArray.widened("connectivity", mesh.connectivity()))
                .array(VtkArray.sequence("offsets", elements, 2, 2))
                .array(VtkArray.constant("types", elements, LINE))
                .line("</Cells>")
                .line("</Piece>");
    }
}
