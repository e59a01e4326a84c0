// SPDX-License-Identifier: Apache-2.0
package reedling.casefile;

import java.util.Optional;

/**
 * A rigid wall.
 *
 * @param name as in the case file
 * @param material name of one of the case's materials
 * @param shape its surface
 * @param motion name of one of the case's motions; empty for a wall at rest
 */
public record WallSpecification(String name, String material, WallShape shape, Optional<String> motion) {}
