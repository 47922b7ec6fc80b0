// SPDX-License-Identifier: Apache-2.0
package tariff;

import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.classes;
import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.fields;
import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.noClasses;

import com.tngtech.archunit.core.importer.ImportOption;
import com.tngtech.archunit.junit.AnalyzeClasses;
import com.tngtech.archunit.junit.ArchTest;
import com.tngtech.archunit.lang.ArchRule;

/** The arrows of the house run one way; each room may know the rooms named here and no other. */
@AnalyzeClasses(packages = "tariff", importOptions = ImportOption.DoNotIncludeTests.class)
class ArchitectureTest {
    @ArchTest
    static final ArchRule NOTICE = knows("tariff.notice");

    @ArchTest
    static final ArchRule METER = knows("tariff.meter", "tariff.notice");

    @ArchTest
    static final ArchRule CLAUSE = knows("tariff.rate.clause", "tariff.meter", "tariff.notice");

    @ArchTest
    static final ArchRule RATE = knows("tariff.rate", "tariff.rate.clause", "tariff.meter", "tariff.notice");

    @ArchTest
    static final ArchRule BILL =
            knows("tariff.bill", "tariff.rate", "tariff.rate.clause", "tariff.meter", "tariff.notice");

    @ArchTest
    static final ArchRule RECONCILE = knows(
            "tariff.reconcile", "tariff.bill", "tariff.rate", "tariff.rate.clause", "tariff.meter", "tariff.notice");

    @ArchTest
    static final ArchRule ELECTRICAL = knows("tariff.electrical");

    @ArchTest
    static final ArchRule CHART = knows("tariff.chart");

    @ArchTest
    static final ArchRule CORRECTION =
            knows("tariff.correction", "tariff.electrical", "tariff.meter", "tariff.notice", "org.hipparchus..");

    @ArchTest
    static final ArchRule PAYBACK = knows("tariff.payback", "tariff.notice", "org.hipparchus..");

    @ArchTest
    static final ArchRule REPORT = knows(
            "tariff.report",
            "tariff.proposal",
            "tariff.correction",
            "tariff.payback",
            "tariff.chart",
            "tariff.electrical",
            "tariff.bill",
            "tariff.rate",
            "tariff.rate.clause",
            "tariff.meter",
            "tariff.notice");

    @ArchTest
    static final ArchRule ONLY_JSON_KNOWS_JACKSON = noClasses()
            .that()
            .resideInAPackage("tariff..")
            .and()
            .resideOutsideOfPackages("tariff.json..", "tariff.service..")
            .should()
            .dependOnClassesThat()
            .resideInAPackage("com.fasterxml..");

    @ArchTest
    static final ArchRule NOTHING_BELOW_KNOWS_PROPOSALS = noClasses()
            .that()
            .resideInAnyPackage("tariff.correction..", "tariff.payback..", "tariff.bill..", "tariff.csv..")
            .should()
            .dependOnClassesThat()
            .resideInAnyPackage("tariff.proposal..", "tariff.json..");

    @ArchTest
    static final ArchRule NO_STATE_IN_STATICS =
            fields().that().areStatic().and().areNotPrivate().should().beFinal();

    private static ArchRule knows(String room, String... others) {
        String[] allowed = new String[others.length + 3];
        System.arraycopy(others, 0, allowed, 0, others.length);
        allowed[others.length] = room;
        allowed[others.length + 1] = "java..";
        allowed[others.length + 2] = "org.jspecify..";
        return classes()
                .that()
                .resideInAPackage(room)
                .should()
                .onlyDependOnClassesThat()
                .resideInAnyPackage(allowed)
                .allowEmptyShould(true)
                .as(room + " knows only " + String.join(", ", others));
    }
}
