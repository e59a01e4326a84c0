// SPDX-License-Identifier: Apache-2.0
package reedling.plugins.field;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.InvalidPathException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import reedling.error.ExitCode;
import reedling.error.Finding;
import reedling.error.ReedlingException;

/**
 * Reads a gas flow from comma-separated text: a header line {@value #HEADER}, then one line for each node of a regular
 * grid, in any order; lines that start with # and empty ones are passed over. An axis may have a single node: the flow is
 * then the same all along it.
 */
final class FlowTable {

    static final String HEADER = "x (m),y (m),z (m),velocity_x (m/s),velocity_y (m/s),velocity_z (m/s)";

    private static final int COLUMNS = 6;
    private static final int MOST_FINDINGS = 20;

    /** Share of the spacing by which a node may miss its place: files round coordinates. */
    private static final double TOLERANCE = 1e-3;

    private final String file;
    private final List<Finding> findings = new ArrayList<>();
    private final List<double[]> nodes = new ArrayList<>();

    private FlowTable(String file) {
        this.file = file;
    }

    /**
     * The flow of a file.
     *
     * @throws ReedlingException with every line that cannot be used, up to 20
     */
    static TableFlow read(String file) {
        FlowTable table = new FlowTable(file);
        table.lines(text(file));
        table.stopAtFindings();
        TableFlow flow = table.flow();
        table.stopAtFindings();
        return flow;
    }

    private static List<String> text(String file) {
        try {
            return Files.readAllLines(Path.of(file), StandardCharsets.UTF_8);
        } catch (IOException | InvalidPathException e) {
            String remedy = "Check the path; a relative one is taken from the folder of the case file.";
            Finding finding = new Finding(file, "table", "unreadable (" + e + ")", "a readable CSV file", remedy);
            throw new ReedlingException(ExitCode.CASE, finding, e);
        }
    }

    private void lines(List<String> lines) {
        boolean headed = false;
        for (int k = 0; k < lines.size(); k++) {
            String line = lines.get(k).strip();
            if (line.isEmpty() || line.startsWith("#")) {
                continue;
            }
            if (headed) {
                node(line, k + 1).ifPresent(nodes::add);
            } else {
                headed = true;
                header(line, k + 1);
            }
        }
        if (nodes.isEmpty() && findings.isEmpty()) {
            find("nodes", "missing", "a line for each node", "Write one line a node below the header.");
        }
    }

    private void header(String line, int number) {
        if (!line.replace("\"", "").replace(" ", "").equals(HEADER.replace(" ", ""))) {
            find("line " + number, shown(line), HEADER, "Give the columns in this order and unit.");
        }
    }

    private Optional<double[]> node(String line, int number) {
        String[] cells = line.split(",", -1);
        double[] node = new double[COLUMNS];
        boolean sound = cells.length == COLUMNS;
        for (int k = 0; sound && k < COLUMNS; k++) {
            try {
                node[k] = Double.parseDouble(cells[k].strip());
                sound = Double.isFinite(node[k]);
            } catch (NumberFormatException e) {
                sound = false;
            }
        }
        if (!sound) {
            find("line " + number, shown(line), "six finite numbers", "Separate them by commas, with decimal points.");
        }
        return sound ? Optional.of(node) : Optional.empty();
    }

    private TableFlow flow() {
        double[] origin = new double[3];
        double[] spacing = new double[3];
        int[] count = new int[3];
        for (int axis = 0; axis < 3; axis++) {
            double[] places = places(axis);
            origin[axis] = places[0];
            count[axis] = places.length;
            spacing[axis] = places.length > 1 ? (places[places.length - 1] - places[0]) / (places.length - 1) : 1;
            for (int k = 0; k < places.length; k++) {
                double off = places[k] - (origin[axis] + k * spacing[axis]);
                if (Math.abs(off) > TOLERANCE * spacing[axis]) {
                    String got = places[k] + " m";
                    String expected = origin[axis] + k * spacing[axis] + " m in steps of " + spacing[axis] + " m";
                    find("coordinate " + "xyz".charAt(axis), got, expected, "The grid must be regular.");
                    break;
                }
            }
        }
        stopAtFindings();
        TableFlow.Grid grid = new TableFlow.Grid(origin, spacing, count);
        return new TableFlow(grid, values(grid));
    }

    /** Coordinates of the nodes along an axis, rising; those that differ by rounding only are one. */
    private double[] places(int axis) {
        double[] all = nodes.stream().mapToDouble(node -> node[axis]).sorted().toArray();
        double span = all[all.length - 1] - all[0];
        double apart = 1e-6 * span;
        List<Double> places = new ArrayList<>(List.of(all[0]));
        for (double place : all) {
            if (place - places.getLast() > apart) {
                places.add(place);
            }
        }
        return places.stream().mapToDouble(Double::doubleValue).toArray();
    }

    private double[] values(TableFlow.Grid grid) {
        long expected = (long) grid.count()[0] * grid.count()[1] * grid.count()[2];
        if (expected != nodes.size()) {
            String got = nodes.size() + " nodes";
            String wanted =
                    expected + " for a grid of " + grid.count()[0] + " x " + grid.count()[1] + " x " + grid.count()[2];
            find("nodes", got, wanted, "Every node of the grid needs one line.");
            stopAtFindings();
        }
        double[] values = new double[3 * nodes.size()];
        Arrays.fill(values, Double.NaN);
        for (double[] node : nodes) {
            int at = 0;
            for (int axis = 2; axis >= 0; axis--) {
                long k = Math.round((node[axis] - grid.origin()[axis]) / grid.spacing()[axis]);
                at = at * grid.count()[axis] + (int) k;
            }
            if (!Double.isNaN(values[3 * at])) {
                String got = "given twice";
                find("node at " + node[0] + ", " + node[1] + ", " + node[2] + " m", got, "one line", "Remove one.");
            }
            System.arraycopy(node, 3, values, 3 * at, 3);
        }
        return values;
    }

    private static String shown(String line) {
        return '"' + (line.length() > 80 ? line.substring(0, 77) + "..." : line) + '"';
    }

    private void find(String what, String got, String expected, String remedy) {
        if (findings.size() < MOST_FINDINGS) {
            findings.add(new Finding(file, file + " " + what, got, expected, remedy));
        }
    }

    private void stopAtFindings() {
        if (!findings.isEmpty()) {
            throw new ReedlingException(ExitCode.CASE, findings);
        }
    }
}
