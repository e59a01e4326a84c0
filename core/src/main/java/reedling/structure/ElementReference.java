// SPDX-License-Identifier: Apache-2.0
package reedling.structure;

import java.util.List;

/**
 * Reference geometry of one element.
 *
 * @param nodes positions as meshed, m
 * @param up direction that turns the section: axis 2 = up x axis 1
 * @param prestretch stretch at the positions as meshed: stress-free size = size / (1 + prestretch)
 */
public record ElementReference(List<Position> nodes, Position up, double prestretch) {

    public ElementReference {
        nodes = List.copyOf(nodes);
    }
}
