package site.laws;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.Map;
import org.junit.jupiter.api.Test;
import reedling.conform.LawTrial;
import reedling.conform.LoadedLaws;
import reedling.conform.Subject;

class @Class@LawTest {

    /** Balance, frames, energy, bits, history, checkpoints, time scale, finite numbers, allocation. */
    @Test
    void lawKeepsTheContract() {
        Subject subject = Subject.of(new @Class@Provider(), Map.of(), LoadedLaws.onClassPath());
        assertThat(LawTrial.findings(subject)).isEmpty();
    }
}
