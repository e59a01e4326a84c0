// SPDX-License-Identifier: Apache-2.0
package reedling.probe;

/**
 * When a grain counts as pegged: its centre stays in the wire layer and within a distance of one place of the deck for
 * some time, and it touches two wires.
 *
 * @param time s
 * @param distance m, in the frame that moves with the deck
 */
public record PegRule(double time, double distance) {}
