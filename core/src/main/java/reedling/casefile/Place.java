// SPDX-License-Identifier: Apache-2.0
package reedling.casefile;

/**
 * Where a value was written.
 *
 * @param source file name, or "--set"
 * @param line counted from 1; 0 if the source has no lines
 * @param column counted from 1; 0 if the source has no lines
 */
record Place(String source, int line, int column) implements Comparable<Place> {

    static final Place COMMAND_LINE = new Place("--set", 0, 0);

    /** As findings print it: {@code deck.toml:14:3}. */
    String where() {
        return line == 0 ? source : source + ":" + line + ":" + column;
    }

    /** File order; the command line comes last. */
    @Override
    public int compareTo(Place other) {
        int lines = Integer.compareUnsigned(line - 1, other.line - 1);
        return lines != 0 ? lines : Integer.compare(column, other.column);
    }
}
