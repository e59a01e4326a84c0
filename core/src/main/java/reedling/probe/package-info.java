// SPDX-License-Identifier: Apache-2.0
/** What is measured in a run: pegging, loads of wires and walls, overlaps, which sizes of grain leave where. */
@org.jspecify.annotations.NullMarked
package reedling.probe;
