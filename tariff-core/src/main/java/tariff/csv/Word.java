// SPDX-License-Identifier: Apache-2.0
package tariff.csv;

import java.util.Collections;
import java.util.HashMap;
import java.util.Map;

/** Words of a heading that change what its figures are, in English, German, French, Spanish, Portuguese and Italian. */
enum Word {
    LAGGING("lagging|lag|inductive|ind|induktiv|induktive|induktiver|inductif|inductiva|inductivo|induttiva|induttivo"
            + "|indutiva|indutivo|nacheilend"),
    LEADING("leading|lead|capacitive|cap|kapazitiv|kapazitive|kapazitiver|capacitif|capacitiva|capacitivo|capacita"
            + "|voreilend"),
    EXPORT("export|exported|fed in|feed in|sent back|einspeisung|ruckspeisung|ruckgespeist|injection|injectee|vertida"
            + "|vertido|inyectada|injetada|immessa|excedentes"),
    ENERGY("energy|consumption|usage|used|electricity|units|verbrauch|stromverbrauch|wirkarbeit|arbeit|wirkenergie"
            + "|energie|consommation|energia|consumo|consumi"),
    REACTIVE("reactive|reactive energy|blindarbeit|blindenergie|blindstrom|blindverbrauch|reactif|energie reactive"
            + "|reactiva|energia reactiva|reativa|energia reativa|reattiva|energia reattiva"),
    DEMAND("demand|max demand|maximum demand|md|max|maximum|highest|leistung|hochstleistung|spitzenleistung"
            + "|maximalleistung|leistungsspitze|leistungsmaximum|maximale|puissance|maximale|maximum|demanda|maxima"
            + "|potencia|maxima demanda|massima|potenza|potenza massima|domanda"),
    PEAK("peak|spitze|pointe|punta|ponta|picco"),
    BILLED("billed|billing|billable|chargeable|verrechnet|verrechnete|abgerechnet|facturee|facturada|faturada"
            + "|fatturata"),
    METERED("metered|measured|registered|recorded|gemessen|mesuree|medida|misurata"),
    POWER_FACTOR("power factor|pf|cos phi|cosphi|cos|cos fi|leistungsfaktor|verschiebungsfaktor"
            + "|facteur de puissance|factor de potencia|fator de potencia|fattore di potenza|fp"),
    MONEY("charge|charges|charged|cost|costs|price|penalty|surcharge|fee|tax|vat|rate|tariff|credit|preis|kosten|gebuhr"
            + "|entgelt|steuer|prix|cout|taxe|precio|coste|costo|preco|custo|prezzo|eur|usd|gbp|chf|inr|brl|pln|zar|aud"
            + "|cad|mxn|rs|sek|nok|dkk|czk|huf|try|amount|betrag|montant|importe|importo|valor"),
    AGREED("contract|contracted|contractual|agreed|subscribed|sanctioned|connected|installed|vertragsleistung"
            + "|bestellte|bestellt|vereinbart|vereinbarte|souscrite|contratada|impegnata|contrattuale|disponibile"),
    AVERAGE("average|avg|mean|min|minimum|lowest|mittel|mittelwert|mittlere|moyen|moyenne|promedio|media|medio|minima"),
    NOT_THE_MONTH("budget|forecast|plan|planned|target|baseline|previous|last year|prior|difference|change|deviation"
            + "|cumulative|opening|closing|loss|losses|zahlerstand|index|excess|allowed|free|vorjahr|ziel"),
    PART_OF_DAY("day|night|off peak|on peak|offpeak|onpeak|mid peak|shoulder|weekend|evening|morning|tag|nacht|ht|nt"
            + "|hochtarif|niedertarif|jour|nuit|hp|hc|hph|hch|hpe|hce|heures pleines|heures creuses|dia|noche|llano"
            + "|valle|noite|vazio|cheias|fora de ponta|fora ponta|giorno|notte|p1|p2|p3|p4|p5|p6|f1|f2|f3|t1|t2|t3"),
    PER_CENT("%|percent|per cent|prozent|pct"),
    NEUTRAL("total|totals|sum|monthly|month|of|the|in|at|and|for|reading|readings|meter|import|imported|drawn|delivered"
            + "|received|active|apparent|power|real|billed period|bezug|wirk|schein|scheinleistung|wirkleistung"
            + "|blindleistung|gesamt|summe|der|die|das|und|active energy|actif|apparente|totale|de|la|le|du|activa|activo"
            + "|aparente|do|da|ativa|ativo|attiva|attivo|di|della|soutiree|prelevata|month s|monats");

    private static final Map<String, Word> BY_PHRASE = byPhrase();
    static final int LONGEST_PHRASE = 3;

    private final String phrases;

    Word(String phrases) {
        this.phrases = phrases;
    }

    /** All phrases, each of at most {@link #LONGEST_PHRASE} words, as {@link Words} writes them. */
    static Map<String, Word> phrases() {
        return BY_PHRASE;
    }

    private static Map<String, Word> byPhrase() {
        Map<String, Word> all = new HashMap<>();
        for (Word word : values()) {
            for (String phrase : word.phrases.split("\\|", -1)) {
                all.put(phrase, word);
            }
        }
        return Collections.unmodifiableMap(all);
    }
}
