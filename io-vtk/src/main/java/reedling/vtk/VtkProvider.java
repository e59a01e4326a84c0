// SPDX-License-Identifier: Apache-2.0
package reedling.vtk;

import java.io.IOException;
import java.nio.file.Path;
import reedling.output.SnapshotWriter;
import reedling.plugin.Provider;

/** The snapshot writer named {@code vtk}. */
public final class VtkProvider implements SnapshotWriter.Provider {

    @Override
    public String name() {
        return "vtk";
    }

    @Override
    public int apiLevel() {
        return Provider.API_LEVEL;
    }

    @Override
    public String summary() {
        return "Writes grains as .vtp, structures as .vtu and one .pvd index, for ParaView and other readers of VTK"
                + " files.";
    }

    @Override
    public String source() {
        return "Kitware, VTK File Formats (XML formats, version 1.0, raw appended data).";
    }

    @Override
    public SnapshotWriter open(Path folder, double resumeTime) throws IOException {
        return VtkSeries.open(folder, resumeTime);
    }
}
