package site.laws;

import java.util.List;
import reedling.contact.ContactLaw;
import reedling.contact.ContactLawProvider;
import reedling.contact.Stage;
import reedling.plugin.Parameter;
import reedling.plugin.ParameterValues;
import reedling.unit.Dimension;

/** Offers the law under the name "@name@"; META-INF/services names this class. */
public final class @Class@Provider implements ContactLawProvider {

    @Override
    public String name() {
        return "@name@";
    }

    @Override
    public int apiLevel() {
        return API_LEVEL;
    }

    @Override
    public String summary() {
        return "Normal force between elastic spheres with a dashpot of a given damping ratio.";
    }

    @Override
    public String source() {
        return "Hertz, On the contact of elastic solids, 1882";
    }

    @Override
    public List<Parameter> parameters() {
        return List.of(new Parameter(
                "damping_ratio", Dimension.NUMBER, 0, 1, 0.1, "Dashpot as a share of the critical one."));
    }

    @Override
    public Stage stage() {
        return Stage.NORMAL;
    }

    @Override
    public ContactLaw create(ParameterValues values) {
        return new @Class@Law(values.get("damping_ratio"));
    }
}
