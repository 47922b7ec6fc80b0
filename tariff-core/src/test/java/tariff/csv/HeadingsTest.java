// SPDX-License-Identifier: Apache-2.0
package tariff.csv;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Names that people write above their figures; common practice, no source. */
class HeadingsTest {

    @ParameterizedTest(name = "{0} is {1}")
    @CsvSource(delimiter = '|', textBlock = """
            kWh                              | energyKwh
            Energy (kWh)                     | energyKwh
            Energy [MWh]                     | energyKwh × 1000
            Total kWh used                   | energyKwh
            kW h                             | energyKwh
            Consumption                      | energyKwh
            Stromverbrauch kWh               | energyKwh
            Consommation (kWh)               | energyKwh
            Consumo (kWh)                    | energyKwh
            Exported kWh                     | exportedKwh
            kWh/month                        | energyKwh
            Reactive kvarh                   | laggingKvarh
            kVArh                            | laggingKvarh
            KVARH lag                        | laggingKvarh
            RkVAh                            | laggingKvarh
            Lagging kvarh                    | laggingKvarh
            Mvarh                            | laggingKvarh × 1000
            Blindarbeit                      | laggingKvarh
            Energía reactiva inductiva kvarh | laggingKvarh
            Energia reativa (kvarh)          | laggingKvarh
            Energia reattiva (kvarh)         | laggingKvarh
            Énergie réactive (kVArh)         | laggingKvarh
            Leading / capacitive kvarh       | leadingKvarh
            Blindarbeit kapazitiv (kvarh)    | leadingKvarh
            kVAh                             | apparentKvah
            Max demand kVA                   | peakKva
            MVA                              | peakKva × 1000
            Peak kW                          | peakKw
            Billed/maximum demand (kW)       | peakKw
            Billed demand (kW)               | peakKw
            Höchstleistung kW                | peakKw
            Puissance maximale (kW)          | peakKw
            MW                               | peakKw × 1000
            kvar                             | peakLaggingKvar
            energyKwh                        | energyKwh
            Power factor                     | powerFactor
            PF                               | powerFactor
            PF (%)                           | powerFactor
            cos phi                          | powerFactor
            cos φ                            | powerFactor
            cosφ                             | powerFactor
            Average power factor             | powerFactor
            Leistungsfaktor                  | powerFactor
            Facteur de puissance             | powerFactor
            Factor de potencia               | powerFactor
            Fator de potência                | powerFactor
            Fattore di potenza               | powerFactor
            Month                            | MONTH
            Billing month                    | MONTH
            Período                          | MONTH
            Mês                              | MONTH
            Mese                             | MONTH
            Year                             | YEAR
            From                             | FROM
            Start                            | FROM
            Von                              | FROM
            Du                               | FROM
            Date de début                    | FROM
            To                               | TO
            End (incl.)                      | TO
            Bis                              | TO
            Hasta                            | TO
            Statement date                   | STATEMENT
            Rechnungsdatum                   | STATEMENT
            Estimated                        | estimated
            Total                            | total
            Amount                           | total
            Bill (EUR)                       | total
            Total charged                    | total
            Total €                          | total
            Rechnungsbetrag                  | total
            Montant TTC                      | total
            Contract demand kW               | ignored
            EUR/kWh                          | ignored
            Price per kWh                    | ignored
            Energy charge (EUR)              | ignored
            PF penalty                       | ignored
            Target power factor              | ignored
            Max demand                       | ignored
            Max demand (kWh)                 | ignored
            Reactive energy kvar             | ignored
            kWh night                        | ignored
            Peak kWh                         | ignored
            kWh, kvarh                       | ignored
            Average kW                       | ignored
            Previous kWh                     | ignored
            lag + lead kvarh                 | ignored
            Remarks                          | ignored
            Temperature                      | ignored
            """)
    void namesThatPeopleWrite(String name, String meaning) {
        Heading heading = new HeadingReader(ReadingChoices.none()).read(name, "");
        assertThat(describe(heading)).isEqualTo(meaning);
    }

    private static String describe(Heading heading) {
        Meaning meaning = heading.meaning();
        if (meaning instanceof Meaning.Reading reading) {
            String factor = heading.factor().toPlainString();
            return reading.register().key() + (factor.equals("1") ? "" : " × " + factor);
        }
        if (meaning instanceof Meaning.Date date) {
            return date.when().name();
        }
        return meaning.getClass().getSimpleName().toLowerCase(java.util.Locale.ROOT);
    }
}
