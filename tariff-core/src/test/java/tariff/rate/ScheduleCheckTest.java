// SPDX-License-Identifier: Apache-2.0
package tariff.rate;

import static org.assertj.core.api.Assertions.assertThat;
import static tariff.rate.Sheets.findings;
import static tariff.rate.Sheets.scheduled;

import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** What a clerk is told of a schedule that cannot be. */
class ScheduleCheckTest {

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            quoteCharacter = '`',
            value = {
                "'slopes': [ { 'below': 85, 'perPoint': 1 } ] | /slopes/0/below: is not a power factor; found 85; allowed: above 0, at most"
                        + " 1, such as 0.85",
                "'slopes': [ { 'below': 0.85, 'perPoint': 1 }, { 'below': 0.850, 'perPoint': 2 } ] | /slopes: has two slopes below 0.850",
                "'slopes': [ { 'below': 0.95, 'perPoint': 1 }, { 'above': 0.90, 'perPoint': -1 } ] | /slopes: overlap: one counts below"
                        + " 0.95, another above 0.90",
                "'slopes': [ { 'perPoint': 1 } ] | /slopes/0: must say either \"below\" or \"above\"; found an object; allowed: {"
                        + " \"below\": 0.90, \"perPoint\": 1 }",
                "'slopes': [ { 'below': 0.9, 'perPoint': 1 } ], 'points': 'start' | /points: is not known; did you mean \"started\"?; found"
                        + " \"start\"; allowed: exact, started, completed, majorFraction",
                "'bands': [ { 'below': 0.85, 'value': 1 } ] | /bands/0: is the last band, so it must be open: a power factor above 0.85 has"
                        + " no value",
                "'bands': [ { 'value': 1 }, { 'value': 0 } ] | /bands/0: has no edge; only the last band may be open",
                "'bands': [ { 'below': 0.85, 'value': 1 }, { 'below': 0.75, 'value': 2 }, { 'value': 0 } ] | /bands/1: must end above the"
                        + " band before it; found 0.75; allowed: more than 0.85",
                "'bands': [ { 'below': 0.85, 'upTo': 0.85, 'value': 1 }, { 'value': 0 } ] | /bands/0: says both \"below\" and \"upTo\"; found"
                        + " an object; allowed: one of the two",
                "'ratioTo': 95 | /ratioTo: is not a power factor; found 95; allowed: above 0, at most 1, such as 0.85",
                "'ratioTo': 0.95, 'onlyBelow': 0 | /onlyBelow: is not a power factor; found 0; allowed: above 0, at most 1, such as 0.85",
                "'ratioTo': 0.95, 'atLeast': 5, 'atMost': 4 | /atLeast: is above \"atMost\"; found 5; allowed: at most 4",
                "'ratio': 0.95 | : says no kind of schedule; found an object; allowed: one of: slopes, bands, ratioTo && /ratio: is not a key"
                        + " here; did you mean \"ratioTo\"?; found ratio; allowed: powerFactor, atLeast, atMost, round, slopes, bands,"
                        + " ratioTo"
            })
    void aScheduleThatCannotBeIsNamed(String schedule, String messages) {
        assertThat(findings(scheduled(schedule)).stream()
                        .map(each -> each.replace("/lines/1/schedule", ""))
                        .collect(java.util.stream.Collectors.joining(" && ")))
                .isEqualTo(messages);
    }
}
