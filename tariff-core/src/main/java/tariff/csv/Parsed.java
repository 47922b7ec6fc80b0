// SPDX-License-Identifier: Apache-2.0
package tariff.csv;

import java.util.ArrayList;
import java.util.Collections;
import java.util.EnumSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;

/**
 * The words of one heading, sorted: what they say, the units among them, the window they name, and what is left.
 *
 * @param units each unit once, in the order written
 * @param window the rate's name of the window, if the heading names one
 * @param rest words that say nothing here
 */
record Parsed(Set<Word> words, List<UnitWord> units, Optional<String> window, List<String> rest) {

    static Parsed of(String heading, List<String> windows) {
        List<String> tokens = new ArrayList<>(Words.of(heading));
        Optional<String> window = windows.stream()
                .filter(name -> !Words.of(name).isEmpty())
                .sorted((a, b) -> Words.of(b).size() - Words.of(a).size())
                .filter(name -> cut(tokens, Words.of(name)))
                .findFirst();
        Set<Word> words = EnumSet.noneOf(Word.class);
        List<UnitWord> units = new ArrayList<>();
        List<String> rest = new ArrayList<>();
        for (int at = 0; at < tokens.size(); ) {
            int length = phraseAt(tokens, at, words);
            if (length == 0) {
                Optional<UnitWord> unit = UnitWord.of(tokens.get(at));
                if (unit.isEmpty()) {
                    rest.add(tokens.get(at));
                } else if (!units.contains(unit.get())) {
                    units.add(unit.get());
                }
                length = 1;
            }
            at += length;
        }
        return new Parsed(words, List.copyOf(units), window, List.copyOf(rest));
    }

    boolean says(Word word) {
        return words.contains(word);
    }

    private static boolean cut(List<String> tokens, List<String> phrase) {
        int at = Collections.indexOfSubList(tokens, phrase);
        if (at < 0) {
            return false;
        }
        tokens.subList(at, at + phrase.size()).clear();
        return true;
    }

    private static int phraseAt(List<String> tokens, int at, Set<Word> words) {
        Map<String, Word> phrases = Word.phrases();
        for (int length = Math.min(Word.LONGEST_PHRASE, tokens.size() - at); length > 0; length--) {
            Word word = phrases.get(String.join(" ", tokens.subList(at, at + length)));
            if (word != null) {
                words.add(word);
                return length;
            }
        }
        return 0;
    }
}
