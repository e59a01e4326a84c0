// SPDX-License-Identifier: Apache-2.0
package reedling.casefile;

import java.util.List;
import java.util.Map;
import java.util.Optional;
import reedling.material.Material;
import reedling.material.MaterialPair;

/**
 * A whole case, checked, in SI units; immutable. Maps keep the order of the file; every name that a part mentions exists.
 *
 * @param title one line
 * @param notes free text, may be empty
 * @param seed of every random stream
 * @param materials by name
 * @param pairs at least one for every two materials that can touch
 * @param lots by name
 * @param feeds by name
 * @param walls by name
 * @param motions by name
 * @param wires rows of wires by name
 * @param outlets by name
 * @param bounds a grain whose centre leaves it is counted as spilled and removed
 * @param screen present if the report is about a screen deck
 * @param probes what else is measured, by name
 * @param laws stages of the contact law
 * @param fields forces on single grains, by name
 * @param steps limits of the time step
 * @param output what is written and when
 */
public record CaseSpecification(
        String title,
        String notes,
        long seed,
        Map<String, Material> materials,
        List<MaterialPair> pairs,
        Map<String, LotSpecification> lots,
        Map<String, FeedSpecification> feeds,
        Map<String, WallSpecification> walls,
        Map<String, MotionSpecification> motions,
        Map<String, WireSpecification> wires,
        Map<String, OutletSpecification> outlets,
        BoxRegion bounds,
        Optional<ScreenSpecification> screen,
        Map<String, ProbeSpecification> probes,
        LawsSpecification laws,
        Map<String, PluginChoice> fields,
        StepSpecification steps,
        OutputSpecification output) {}
