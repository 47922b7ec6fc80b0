// SPDX-License-Identifier: Apache-2.0
package tariff.report;

import java.util.ArrayDeque;
import java.util.Collections;
import java.util.Deque;
import java.util.IdentityHashMap;
import java.util.Set;
import tariff.bill.StatementLine;
import tariff.rate.clause.Figure;

/**
 * Derivations as nested lists, to be followed with a pencil. A figure is worked out where it first appears. Of each line the steps
 * nearest to its amount are told, so many and no more, and of a whole bill so many: what leans on a long past would have no end.
 */
final class Steps {
    private static final int MOST_OF_A_LINE = 40;
    private static final int MOST_OF_A_BILL = 600;
    private static final int LONGEST = 600;

    private final Html page;
    private final Set<Figure> told = Collections.newSetFromMap(new IdentityHashMap<>());
    private int left = MOST_OF_A_BILL;

    Steps(Html page) {
        this.page = page;
    }

    void write(StatementLine line) {
        String amount = line.name() + ": " + line.amount().toPlainString()
                + (line.shownOnly() ? " (shown only, not in the total)" : "");
        page.open("li").text("b", amount);
        if (line.derivation().isPresent()) {
            Set<Figure> toTell = nearest(line.derivation().get());
            page.open("ul");
            write(line.derivation().get(), toTell);
            page.close();
        } else {
            page.words("does not apply");
        }
        page.close();
    }

    private Set<Figure> nearest(Figure result) {
        Set<Figure> near = Collections.newSetFromMap(new IdentityHashMap<>());
        Deque<Figure> next = new ArrayDeque<>();
        next.add(result);
        while (!next.isEmpty() && near.size() < Math.min(MOST_OF_A_LINE, left)) {
            Figure figure = next.remove();
            if (!figure.from().isEmpty() && !told.contains(figure) && near.add(figure)) {
                next.addAll(figure.from());
            }
        }
        left -= near.size();
        return near;
    }

    private void write(Figure figure, Set<Figure> toTell) {
        if (figure.from().isEmpty()) {
            page.text("li", figure.how().isEmpty() ? figure.text() : figure.text() + ": " + clipped(figure.how()));
        } else if (toTell.contains(figure) && told.add(figure)) {
            page.open("li").words(clipped(figure.derivation()));
            if (figure.from().stream().anyMatch(part -> !part.how().isEmpty())) {
                page.open("ul");
                figure.from().stream().filter(part -> !part.how().isEmpty()).forEach(part -> write(part, toTell));
                page.close();
            }
            page.close();
        } else {
            page.text(
                    "li",
                    clipped(figure.derivation()) + (told.contains(figure) ? " (worked out above)" : " (and so on)"));
        }
    }

    private static String clipped(String working) {
        return working.length() <= LONGEST ? working : working.substring(0, LONGEST) + " …";
    }
}
