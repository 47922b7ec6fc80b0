// SPDX-License-Identifier: Apache-2.0
package tariff.json;

import static org.assertj.core.api.Assertions.assertThat;

import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;
import tariff.bill.Billing;
import tariff.meter.MeteredMonth;
import tariff.meter.Register;
import tariff.meter.Site;
import tariff.rate.Rate;

class StatementsJsonTest {

    private static String write(String rate, List<MeteredMonth> months) {
        Rate read = RateFile.parse(rate.replace('\'', '"'));
        byte[] json = StatementsJson.write(read, new Billing(read, Site.unnamed()).statements(months))
                .bytes();
        return new String(json, StandardCharsets.UTF_8);
    }

    /** Own arithmetic: 400 × 11.40 = 4,560.00. */
    @Test
    void aLineCarriesItsWorkingAsATree() {
        assertThat(write(
                        "{'name':'A','currency':'EUR','lines':[{'name':'Demand','quantity':{'peak':'kW'},'price':11.40}]}",
                        List.of(MeteredMonth.of("2026-04").with(Register.PEAK_KW, "400"))))
                .isEqualTo("""
                        {
                          "rate" : "A",
                          "currency" : "EUR",
                          "total" : 4560.00,
                          "statements" : [
                            {
                              "month" : "2026-04",
                              "total" : 4560.00,
                              "lines" : [
                                {
                                  "name" : "Demand",
                                  "amount" : 4560.00,
                                  "derivation" : {
                                    "value" : 4560.00,
                                    "unit" : "money",
                                    "how" : "400 kW × 11.4",
                                    "from" : [
                                      {
                                        "value" : 400,
                                        "unit" : "kW",
                                        "how" : "kW"
                                      },
                                      {
                                        "value" : 11.40
                                      }
                                    ]
                                  }
                                }
                              ],
                              "assumptions" : [ ]
                            }
                          ]
                        }""");
    }

    /** A demand that leans on its own eleven months before would double with each month if every step were written out. */
    @Test
    void aRatchetOverItselfStaysReadable() {
        List<MeteredMonth> months = new ArrayList<>();
        for (int i = 0; i < 36; i++) {
            months.add(MeteredMonth.of(
                            java.time.YearMonth.of(2023, 1).plusMonths(i).toString())
                    .with(Register.PEAK_KW, 400 - i));
        }
        String json = write(
                "{'name':'A','currency':'EUR','quantities':{'billed':{'largest':[{'peak':'kW'},{'share':0.8,'of':"
                        + "{'earlier':'highest','of':'billed','months':11}}]}},"
                        + "'lines':[{'name':'Demand','quantity':'billed','price':1}]}",
                months);
        assertThat(json.length()).isLessThan(3_000_000);
    }
}
