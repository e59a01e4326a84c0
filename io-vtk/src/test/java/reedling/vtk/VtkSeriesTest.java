// SPDX-License-Identifier: Apache-2.0
package reedling.vtk;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.ServiceLoader;
import java.util.stream.DoubleStream;
import java.util.stream.IntStream;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import reedling.output.SnapshotFrame;
import reedling.output.SnapshotFrame.GrainCloud;
import reedling.output.SnapshotFrame.LineMesh;
import reedling.output.SnapshotFrame.NamedArray;
import reedling.output.SnapshotWriter;

class VtkSeriesTest {

    private static final int GRAINS = 137;
    private static final int WIRES = 9;
    private static final int ELEMENTS = 12;

    @TempDir
    Path folder;

    @Test
    void providerIsFoundByItsName() {
        assertThat(ServiceLoader.load(SnapshotWriter.Provider.class))
                .extracting(SnapshotWriter.Provider::name)
                .contains("vtk");
    }

    @Test
    void grainsComeBackBitForBit() throws Exception {
        SnapshotFrame frame = frame(0.1 + 0.2, 77);
        VtkSeries.open(folder, Double.NaN).write(frame);
        VtkFile file = new VtkFile(folder.resolve("snapshots/grains_000000.vtp"));
        assertThat(file.attribute("/VTKFile", "byte_order")).isEqualTo("LittleEndian");
        assertThat(file.attribute("/VTKFile", "header_type")).isEqualTo("UInt64");
        assertThat(file.integer("//Piece", "NumberOfPoints")).isEqualTo(GRAINS);
        assertThat(file.integer("//Piece", "NumberOfVerts")).isEqualTo(GRAINS);
        assertThat(file.array("FieldData", "TimeValue")).containsExactly(0.1 + 0.2);
        assertThat(file.array("FieldData", "Step")).containsExactly(77);
        assertThat(file.array("Points", "Points")).isEqualTo(frame.grains().positions());
        for (NamedArray field : frame.grains().fields()) {
            assertThat(file.array("PointData", field.name())).isEqualTo(asDoubles(field));
        }
        assertThat(file.array("Verts", "connectivity"))
                .isEqualTo(IntStream.range(0, GRAINS).asDoubleStream().toArray());
        assertThat(file.array("Verts", "offsets"))
                .isEqualTo(IntStream.rangeClosed(1, GRAINS).asDoubleStream().toArray());
    }

    @Test
    void wiresComeBackBitForBit() throws Exception {
        SnapshotFrame frame = frame(0.5, 3);
        VtkSeries.open(folder, Double.NaN).write(frame);
        LineMesh mesh = frame.structures().getFirst();
        VtkFile file = new VtkFile(folder.resolve("snapshots/wires_000000.vtu"));
        assertThat(file.integer("//Piece", "NumberOfPoints")).isEqualTo(WIRES * (ELEMENTS + 1));
        assertThat(file.integer("//Piece", "NumberOfCells")).isEqualTo(WIRES * ELEMENTS);
        assertThat(file.array("Points", "Points")).isEqualTo(mesh.points());
        assertThat(file.array("Cells", "connectivity"))
                .isEqualTo(IntStream.of(mesh.connectivity()).asDoubleStream().toArray());
        assertThat(file.array("Cells", "offsets"))
                .isEqualTo(DoubleStream.iterate(2, end -> end + 2)
                        .limit(mesh.elements())
                        .toArray());
        assertThat(file.array("Cells", "types")).hasSize(mesh.elements()).containsOnly(3);
        for (NamedArray field : mesh.cellFields()) {
            assertThat(file.array("CellData", field.name())).isEqualTo(asDoubles(field));
        }
    }

    @Test
    void firstAppendedBytesAreALengthAndAValue() throws IOException {
        VtkSeries.open(folder, Double.NaN).write(frame(1, 2));
        byte[] bytes = Files.readAllBytes(folder.resolve("snapshots/grains_000000.vtp"));
        String latin = new String(bytes, java.nio.charset.StandardCharsets.ISO_8859_1);
        assertThat(latin)
                .startsWith("<?xml version=\"1.0\"?>\n"
                        + "<VTKFile type=\"PolyData\" version=\"1.0\" byte_order=\"LittleEndian\""
                        + " header_type=\"UInt64\">\n"
                        + "<PolyData>\n"
                        + "<FieldData>\n"
                        + "<DataArray type=\"Float64\" Name=\"TimeValue\" NumberOfComponents=\"1\""
                        + " NumberOfTuples=\"1\" format=\"appended\" offset=\"0\"/>\n");
        int first = latin.indexOf("<AppendedData encoding=\"raw\">\n_") + "<AppendedData encoding=\"raw\">\n_".length();
        assertThat(java.util.Arrays.copyOfRange(bytes, first, first + 32))
                .containsExactly(
                        8, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0, 0xF0, 0x3F, 8, 0, 0, 0, 0, 0, 0, 0, 2, 0, 0, 0, 0, 0,
                        0, 0);
    }

    @Test
    void namesWithMarkupAreEscapedAndFilesStayInTheFolder() throws Exception {
        GrainCloud grains =
                new GrainCloud(1, new double[3], List.of(new NamedArray.Doubles("a<\"b\">&", 1, new double[] {4})));
        LineMesh mesh = new LineMesh("../grains & wires", new double[6], new int[] {0, 1}, List.of(), List.of());
        VtkSeries.open(folder, Double.NaN).write(new SnapshotFrame(0, 0, grains, List.of(mesh, mesh)));
        assertThat(new VtkFile(folder.resolve("snapshots/grains_000000.vtp")).array("PointData", "a<\"b\">&"))
                .containsExactly(4);
        assertThat(files())
                .containsExactly(
                        "---grains---wires-part2_000000.vtu", "---grains---wires_000000.vtu", "grains_000000.vtp");
        assertIndexNamesWholeFiles(3);
    }

    @Test
    void emptyCloudIsWrittenWithoutValues() throws Exception {
        VtkSeries.open(folder, Double.NaN)
                .write(new SnapshotFrame(0, 0, new GrainCloud(0, new double[0], List.of()), List.of()));
        VtkFile file = new VtkFile(folder.resolve("snapshots/grains_000000.vtp"));
        assertThat(file.array("Points", "Points")).isEmpty();
        assertThat(file.appendedBytes()).isEqualTo(2 * 16 + 3 * 8);
    }

    @Test
    void indexNamesWholeFilesAfterEveryFrame() throws Exception {
        VtkSeries series = VtkSeries.open(folder, Double.NaN);
        for (int step = 0; step < 4; step++) {
            series.write(frame(0.1 * step, step));
            assertIndexNamesWholeFiles(2 * (step + 1));
        }
    }

    @Test
    void failingFrameLeavesNoFileAndAnUnchangedIndex() throws Exception {
        VtkSeries series = VtkSeries.open(folder, Double.NaN);
        series.write(frame(0, 0));
        Files.createDirectories(folder.resolve("snapshots/wires_000001.vtu/in the way"));
        assertThatThrownBy(() -> series.write(frame(0.1, 1))).isInstanceOf(IOException.class);
        assertThat(files()).doesNotContain(".wires_000001.vtu.part");
        assertIndexNamesWholeFiles(2);
        assertThat(PvdIndex.read(folder.resolve("snapshots.pvd")).entries())
                .extracting(PvdIndex.Entry::time)
                .containsOnly(0.0);
    }

    @Test
    void resumeDropsLaterFramesAndTheirFiles() throws Exception {
        VtkSeries series = VtkSeries.open(folder, Double.NaN);
        for (int step = 0; step < 4; step++) {
            series.write(frame(0.1 * step, step));
        }
        Files.writeString(folder.resolve("snapshots/grains_000004.vtp"), "written, but the index was not");
        Files.writeString(folder.resolve("snapshots/.wires_000004.vtu.part"), "torn");
        Files.writeString(folder.resolve("snapshots/notes.txt"), "of the user");
        SnapshotWriter resumed = new VtkProvider().open(folder, 0.1);
        assertThat(files())
                .containsExactly(
                        "grains_000000.vtp", "grains_000001.vtp", "notes.txt", "wires_000000.vtu", "wires_000001.vtu");
        resumed.write(frame(0.2, 9));
        assertIndexNamesWholeFiles(6);
        assertThat(new VtkFile(folder.resolve("snapshots/grains_000002.vtp")).array("FieldData", "Step"))
                .containsExactly(9);
    }

    @Test
    void frameOfTheSameTimeReplacesTheLastOne() throws Exception {
        VtkSeries.open(folder, Double.NaN).write(frame(0.1, 1));
        VtkSeries.open(folder, 0.1).write(frame(0.1, 2));
        assertIndexNamesWholeFiles(2);
        assertThat(new VtkFile(folder.resolve("snapshots/grains_000000.vtp")).array("FieldData", "Step"))
                .containsExactly(2);
    }

    @Test
    void newSeriesNeverOverwritesAnEarlierOne() throws IOException {
        VtkSeries.open(folder, Double.NaN).write(frame(0, 0));
        assertThatThrownBy(() -> VtkSeries.open(folder, Double.NaN)).hasMessageContaining("earlier run");
    }

    private static SnapshotFrame frame(double time, long step) {
        return SyntheticDeck.frame(time, step, GRAINS, WIRES, ELEMENTS);
    }

    private List<String> files() throws IOException {
        try (Stream<Path> files = Files.list(folder.resolve("snapshots"))) {
            return files.map(file -> file.getFileName().toString()).sorted().toList();
        }
    }

    private void assertIndexNamesWholeFiles(int expected) throws Exception {
        List<PvdIndex.Entry> entries =
                PvdIndex.read(folder.resolve("snapshots.pvd")).entries();
        assertThat(entries).hasSize(expected);
        for (PvdIndex.Entry entry : entries) {
            assertThat(new VtkFile(folder.resolve(entry.file())).array("FieldData", "TimeValue"))
                    .containsExactly(entry.time());
        }
    }

    private static double[] asDoubles(NamedArray array) {
        return switch (array) {
            case NamedArray.Doubles(String name, int components, double[] values) -> values;
            case NamedArray.Ints(String name, int components, int[] values) ->
                IntStream.of(values).asDoubleStream().toArray();
            case NamedArray.Floats(String name, int components, float[] values) ->
                IntStream.range(0, values.length).mapToDouble(i -> values[i]).toArray();
        };
    }
}
