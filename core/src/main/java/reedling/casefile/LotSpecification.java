// SPDX-License-Identifier: Apache-2.0
package reedling.casefile;

/**
 * A lot of grain.
 *
 * @param name as in the case file
 * @param material name of one of the case's materials
 * @param diameter its sizes
 */
public record LotSpecification(String name, String material, DiameterSpecification diameter) {}
