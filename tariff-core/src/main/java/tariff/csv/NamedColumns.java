// SPDX-License-Identifier: Apache-2.0
package tariff.csv;

import java.util.Collections;
import java.util.HashMap;
import java.util.Map;
import java.util.Optional;
import tariff.meter.Register;

/** Headings known by the whole name: dates, the bill's amount, the mark of an estimate, and the registers' own names. */
final class NamedColumns {
    private static final Map<String, Heading> ALL = all();

    private NamedColumns() {}

    /** By the name's words, in small letters without accents and without a currency. */
    static Map<String, Heading> byName() {
        return ALL;
    }

    private static Map<String, Heading> all() {
        Map<String, Heading> all = new HashMap<>();
        dates(
                all,
                Meaning.When.MONTH,
                0,
                "month|billing month|bill month|month of bill|period|billing period|bill period"
                        + "|monat|abrechnungsmonat|zeitraum|abrechnungszeitraum|periode|mois|periode de facturation|mes"
                        + "|mes de facturacion|periodo|periodo de facturacion|mes de referencia|periodo de faturacao|mese"
                        + "|periodo di fatturazione|mese di competenza|month year|months|monate");
        dates(all, Meaning.When.MONTH, 1, "date|datum|fecha|data");
        dates(all, Meaning.When.YEAR, 0, "year|billing year|jahr|annee|ano|anno");
        dates(
                all,
                Meaning.When.FROM,
                0,
                "from|start|start date|from date|date from|period start|period from|billing from"
                        + "|billing start|first day|previous reading date|previous read date|von|beginn|anfang|ab|du|debut"
                        + "|date de debut|date debut|desde|inicio|fecha inicio|fecha de inicio|fecha desde|de|data inicio"
                        + "|data de inicio|da|dal|inizio|data inizio|begin");
        dates(
                all,
                Meaning.When.TO,
                0,
                "to|end|end date|to date|date to|period end|period to|billing to|billing end"
                        + "|last day|until|reading date|read date|current reading date|bis|ende|au|fin|date de fin|date fin|hasta"
                        + "|fecha fin|fecha de fin|fecha hasta|ate|fim|data fim|data de fim|a|al|fine|data fine");
        dates(
                all,
                Meaning.When.STATEMENT,
                0,
                "statement date|bill date|billing date|invoice date|date of bill|issued"
                        + "|date of invoice|issue date|date issued|rechnungsdatum|date de facture|date facture"
                        + "|date de la facture|fecha de factura|fecha factura|fecha de emision|data da fatura|data fatura"
                        + "|data de emissao|data fattura|data emissione|data di emissione");
        put(
                all,
                new Meaning.Estimated(),
                0,
                "estimated|estimate|estimated reading|reading estimated|estimated read|est"
                        + "|geschatzt|estime|estimee|estimada|estimado|stimata|stimato");
        put(
                all,
                new Meaning.Total(),
                0,
                "total|total charged|total amount|total bill|bill total|total cost|total charges"
                        + "|total due|invoice total|total invoice|grand total|gesamt|gesamtbetrag|rechnungsbetrag|summe"
                        + "|total facture|montant total|montant ttc|total ttc|importe total|total factura|valor total|total da fatura"
                        + "|total fatura|totale|importo totale|totale fattura|totale bolletta");
        put(
                all,
                new Meaning.Total(),
                1,
                "amount|bill|bill amount|amount billed|amount charged|charged|billed|amount due"
                        + "|invoice|invoice amount|cost|net amount|total excl vat|total before tax|total ht|betrag|rechnung"
                        + "|kosten|montant|facture|montant facture|importe|factura|valor|fatura|importo|fattura|bolletta");
        for (Register register : Register.values()) {
            put(all, new Meaning.Reading(register, Optional.empty()), 0, Words.plain(register.key()));
        }
        return Collections.unmodifiableMap(all);
    }

    private static void dates(Map<String, Heading> all, Meaning.When when, int rank, String names) {
        put(all, new Meaning.Date(when), rank, names);
    }

    private static void put(Map<String, Heading> all, Meaning meaning, int rank, String names) {
        for (String name : names.split("\\|", -1)) {
            all.put(name, Heading.of("", meaning).rank(rank));
        }
    }
}
