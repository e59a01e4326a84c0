// SPDX-License-Identifier: Apache-2.0
package reedling.contact;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.lang.reflect.Method;
import java.util.Arrays;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class NamedLawTest {

    @Test
    void whatAKernelThrowsGetsTheNameOfItsLaw() {
        NamedKernel kernel = new NamedKernel("soft-shell", block -> {
            throw new IllegalStateException("table is empty");
        });
        assertThatThrownBy(() -> kernel.apply(new ContactBlock()))
                .isInstanceOf(LawFault.class)
                .hasMessageContaining("soft-shell")
                .hasMessageContaining("table is empty")
                .hasCauseInstanceOf(IllegalStateException.class);
    }

    /** A question that is not passed on would be answered for the law by the interface. */
    @ParameterizedTest
    @CsvSource({
        "reedling.contact.NamedLaw, reedling.contact.ContactLaw",
        "reedling.contact.NamedKernel, reedling.contact.ContactKernel"
    })
    void everyQuestionIsPassedOn(Class<?> wrapper, Class<?> asked) {
        List<String> answered =
                Arrays.stream(wrapper.getDeclaredMethods()).map(Method::getName).toList();
        assertThat(asked.getMethods())
                .filteredOn(Method::isDefault)
                .extracting(Method::getName)
                .isNotEmpty()
                .allSatisfy(name -> assertThat(answered).contains(name));
    }
}
