// SPDX-License-Identifier: Apache-2.0
package tariff.reconcile;

import java.util.List;
import java.util.Map;
import java.util.stream.Stream;
import tariff.rate.RateSource;

/** What earlier months would add is left out: a ratchet that was not applied. */
record RatchetLeftOut() implements Cause {
    private static final String LARGEST = "largest";

    @Override
    public String code() {
        return "ratchet-left-out";
    }

    @Override
    public boolean mayBeOfSingleMonths() {
        return true;
    }

    @Override
    public Stream<Trial> trials(Case bills) {
        return bills.rewritten(this, "the ratchet left out", RatchetLeftOut::withoutPast);
    }

    private static Object withoutPast(Object value) {
        if (!(value instanceof Map<?, ?> map) || !(map.get(LARGEST) instanceof List<?> terms)) {
            return value;
        }
        List<Object> left = terms.stream()
                .map(Object.class::cast)
                .filter(term -> !RateSource.mentions(term, "earlier"))
                .toList();
        if (left.isEmpty() || left.size() == terms.size()) {
            return value;
        }
        return left.size() == 1 ? left.get(0) : Keys.with(map, LARGEST, left);
    }
}
