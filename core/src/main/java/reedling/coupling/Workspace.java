// SPDX-License-Identifier: Apache-2.0
package reedling.coupling;

/** What one worker needs while it works through tasks: a range of contact rows and a row under construction. */
final class Workspace {

    private final RowRange rows = new RowRange();
    private final SurfaceRow row = new SurfaceRow();

    RowRange rows() {
        return rows;
    }

    SurfaceRow row() {
        return row;
    }
}
