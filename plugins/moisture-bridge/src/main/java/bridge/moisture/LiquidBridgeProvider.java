// SPDX-License-Identifier: Apache-2.0
package bridge.moisture;

import java.util.List;
import reedling.contact.ContactLaw;
import reedling.contact.ContactLawProvider;
import reedling.contact.Stage;
import reedling.plugin.Parameter;
import reedling.plugin.ParameterValues;
import reedling.unit.Dimension;

/** Offers {@link LiquidBridgeLaw} under the name {@code liquid-bridge}. */
public final class LiquidBridgeProvider implements ContactLawProvider {

    private static final String TENSION = "surface_tension";
    private static final String ANGLE = "contact_angle";
    private static final String VOLUME = "volume";
    private static final String WALLS = "on_walls";
    private static final String WIRES = "on_wires";

    @Override
    public String name() {
        return "liquid-bridge";
    }

    @Override
    public int apiLevel() {
        return API_LEVEL;
    }

    @Override
    public String summary() {
        return "Attraction by a bridge of liquid that forms at the touch and breaks across a gap.";
    }

    @Override
    public String source() {
        return "Rabinovich, Esayanur and Moudgil, Capillary forces between two spheres with a fixed volume liquid bridge,"
                + " 2005; Lian, Thornton and Adams 1993 (from memory)";
    }

    @Override
    public List<Parameter> parameters() {
        return List.of(
                new Parameter(
                        TENSION,
                        Dimension.SURFACE_ENERGY,
                        1e-6,
                        10,
                        0.072,
                        "Surface tension of the liquid; N/m is the same unit. The default is that of water."),
                new Parameter(
                        ANGLE,
                        Dimension.ANGLE,
                        0,
                        1.5,
                        0,
                        "Angle at which the liquid meets the solid; 0 wets it wholly."),
                new Parameter(
                        VOLUME, Dimension.VOLUME, 1e-24, 1e-3, Double.NaN, "Liquid in one bridge between two grains."),
                new Parameter(
                        WALLS, Dimension.NUMBER, 0, 1e3, 1, "Liquid in a bridge to a wall over that between grains."),
                new Parameter(
                        WIRES, Dimension.NUMBER, 0, 1e3, 1, "Liquid in a bridge to a wire over that between grains."));
    }

    @Override
    public Stage stage() {
        return Stage.ADHESION;
    }

    @Override
    public ContactLaw create(ParameterValues values) {
        return new LiquidBridgeLaw(
                values.get(TENSION), values.get(ANGLE), values.get(VOLUME), values.get(WALLS), values.get(WIRES));
    }
}
