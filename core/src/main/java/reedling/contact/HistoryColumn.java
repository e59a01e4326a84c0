// SPDX-License-Identifier: Apache-2.0
package reedling.contact;

/**
 * One thing a law remembers of a contact from step to step.
 *
 * @param name for checkpoints
 * @param components 1 for a scalar; 3 for a vector in world axes, whose sign turns when first and second are exchanged
 */
public record HistoryColumn(String name, int components) {

    public static HistoryColumn scalar(String name) {
        return new HistoryColumn(name, 1);
    }

    public static HistoryColumn vector(String name) {
        return new HistoryColumn(name, 3);
    }
}
