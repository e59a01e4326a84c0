// SPDX-License-Identifier: Apache-2.0
package reedling.plugins.conform;

import static org.assertj.core.api.Assertions.assertThat;
import static reedling.contact.ContactBlock.at;
import static reedling.plugins.conform.BrokenLaws.column;

import java.util.List;
import java.util.Map;
import org.assertj.core.api.ListAssert;
import org.junit.jupiter.api.Test;
import reedling.conform.LawTrial;
import reedling.conform.LoadedLaws;
import reedling.conform.Subject;
import reedling.contact.Column;
import reedling.contact.ContactLawProvider;
import reedling.contact.HistoryColumn;

/** A law with one thing broken fails the check made for that thing. */
class BrokenLawsTest {

    private static volatile double[] sink = new double[0];

    private static ListAssert<String> findingsOf(ContactLawProvider broken) {
        return assertThat(LawTrial.findings(Subject.of(broken, Map.of(), LoadedLaws.onClassPath())));
    }

    @Test
    void lawThatPushesHarderOnTheWayOutCreatesEnergy() {
        findingsOf(BrokenLaws.scaled((c, row) -> column(c, Column.CLOSING, row) < 0 ? 1.1 : 1))
                .anyMatch(finding -> finding.startsWith("passivity: A closed motion creates 0."));
    }

    @Test
    void lawThatLooksAtTheFirstBodyOnlyIsAsymmetric() {
        findingsOf(BrokenLaws.scaled((c, row) -> 1 + column(c, Column.LEVER_FIRST, row)))
                .anyMatch(finding -> finding.startsWith("action and reaction: With the two bodies exchanged"));
    }

    @Test
    void lawThatMovesTheContactPointOfOneBodyUnbalancesTheTorques() {
        findingsOf(BrokenLaws.friction(List.of(HistoryColumn.vector("stretch")), (block, column) -> {
                    double[] c = block.columns();
                    for (int r = 0; r < block.rows(); r++) {
                        c[at(Column.LEVER_FIRST) + r] *= 0.9;
                    }
                    return null;
                }))
                .anyMatch(finding -> finding.startsWith("action and reaction: The torques do not balance"));
    }

    @Test
    void lawThatPrefersADirectionDependsOnTheFrame() {
        findingsOf(BrokenLaws.scaled((c, row) -> 1 + 0.01 * Math.abs(column(c, Column.NORMAL, row))))
                .anyMatch(finding -> finding.startsWith("frame indifference: In a turned and moving frame"));
    }

    @Test
    void lawThatDeclaresALongerContactLies() {
        findingsOf(BrokenLaws.normal(block -> {}, 4))
                .singleElement()
                .asString()
                .startsWith("honest time scale: The law declares a contact")
                .contains("steps would be too long");
    }

    @Test
    void lawThatHidesItsStiffnessLies() {
        findingsOf(BrokenLaws.normal(
                        block -> {
                            double[] c = block.columns();
                            for (int r = 0; r < block.rows(); r++) {
                                c[at(Column.STIFFNESS) + r] *= 0.1;
                            }
                        },
                        1))
                .singleElement()
                .asString()
                .startsWith("honest time scale: The normal stiffness declared is 0.1");
    }

    @Test
    void lawThatDividesByTheClosingSpeedGivesNoNumber() {
        findingsOf(BrokenLaws.scaled((c, row) -> {
                    double closing = column(c, Column.CLOSING, row);
                    return closing / Math.abs(closing);
                }))
                .anyMatch(finding -> finding.startsWith("finite numbers: The law wrote something that is not"));
    }

    @Test
    void lawThatMakesAnArrayABlockAllocates() {
        findingsOf(BrokenLaws.normal(block -> sink = new double[block.rows()], 1))
                .singleElement()
                .asString()
                .matches("no allocation: The kernel allocates [0-9]+ bytes a block .*");
    }

    @Test
    void vectorDeclaredAsScalarsTurnsTheWrongWayInASearch() {
        findingsOf(BrokenLaws.friction(
                        List.of(HistoryColumn.scalar("x"), HistoryColumn.scalar("y"), HistoryColumn.scalar("z")),
                        (block, column) -> null))
                .singleElement()
                .asString()
                .startsWith("history is what it is declared to be: After searches the forces differ");
    }

    @Test
    void lawThatCountsInAFieldForgetsInACheckpoint() {
        long[] calls = {0};
        findingsOf(BrokenLaws.normal(
                        block -> {
                            calls[0]++;
                            double[] c = block.columns();
                            for (int r = 0; r < block.rows(); r++) {
                                c[at(Column.ELASTIC_FORCE) + r] *= 1 + 1e-9 * (calls[0] % 1000);
                            }
                        },
                        1))
                .anyMatch(finding -> finding.startsWith("checkpoint and back: "))
                .anyMatch(finding -> finding.startsWith("splitting a block changes no bit: "));
    }

    @Test
    void lawThatLooksAtTheRowBesideItDependsOnTheBlock() {
        findingsOf(BrokenLaws.scaled((c, row) -> 1 + 1e-9 * column(c, Column.CLOSING, row ^ 1)))
                .anyMatch(finding -> finding.startsWith("splitting a block changes no bit: "));
    }

    @Test
    void whatALawThrowsIsAFinding() {
        findingsOf(BrokenLaws.normal(
                        block -> {
                            throw new IllegalStateException("table is empty");
                        },
                        1))
                .anyMatch(finding -> finding.contains("The law throws") && finding.contains("table is empty"));
    }
}
