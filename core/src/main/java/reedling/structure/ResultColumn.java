// SPDX-License-Identifier: Apache-2.0
package reedling.structure;

import reedling.unit.Dimension;

/**
 * One number per element that an element law reports for output.
 *
 * @param name snake_case word
 * @param dimension physical dimension
 */
public record ResultColumn(String name, Dimension dimension) {}
