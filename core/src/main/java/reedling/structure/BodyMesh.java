// SPDX-License-Identifier: Apache-2.0
package reedling.structure;

/**
 * One body to be meshed.
 *
 * @param name as in the case file
 * @param law law of all its elements
 * @param nodes node ids of its elements, {@code law.nodesPerElement()} per element
 * @param up direction that turns the sections: axis 2 = up x axis 1
 * @param prestretch stretch of the elements as meshed
 * @param rigid whether all nodes follow the support and no element force acts
 */
record BodyMesh(String name, ElementLaw law, int[] nodes, Position up, double prestretch, boolean rigid) {}
