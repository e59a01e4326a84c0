// SPDX-License-Identifier: Apache-2.0
package reedling.cli;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;
import reedling.plugin.Parameter;
import reedling.plugin.PluginDescription;
import reedling.unit.Dimension;

class PluginsJsonTest {

    @Test
    void everyFactOfAPluginIsWritten() {
        Parameter gap = new Parameter("gap", Dimension.LENGTH, 0, Double.POSITIVE_INFINITY, Double.NaN, "Free gap.");
        PluginDescription plugin =
                new PluginDescription("soft-shell", "contact", "/p/a.jar", "1.2", "Softens.", "Hertz", List.of(gap));
        assertThat(PluginsJson.of(List.of(plugin), Map.of("soft-shell", "normal")))
                .isEqualTo("""
                [{"name": "soft-shell", "kind": "contact", "stage": "normal", "version": "1.2", "jar": "/p/a.jar", \
                "summary": "Softens.", "source": "Hertz", "parameters": [{"name": "gap", "unit": "m", \
                "minimum": 0.0, "maximum": null, "default": null, "meaning": "Free gap."}]}]""");
    }

    @Test
    void wordsAreListedWithTheirChoices() {
        Parameter mood = Parameter.choice("mood", List.of("mild", "gusty"), "mild", "How it blows.");
        PluginDescription plugin =
                new PluginDescription("breeze", "field", "/p/a.jar", "1", "Blows.", "none", List.of(mood));
        assertThat(PluginsJson.of(List.of(plugin), Map.of())).endsWith("""
                "parameters": [{"name": "mood", "kind": "choice", "choices": ["mild", "gusty"], "default": "mild", \
                "meaning": "How it blows."}]}]""");
    }

    @Test
    void quotesBackslashesAndControlCharactersAreEscaped() {
        PluginDescription plugin = new PluginDescription("a", "field", "C:\\a", "1", "say \"x\"\n", "s", List.of());
        assertThat(PluginsJson.of(List.of(plugin), Map.of())).contains("C:\\\\a", "say \\\"x\\\"\\u000a");
    }
}
