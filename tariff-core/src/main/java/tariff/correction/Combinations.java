// SPDX-License-Identifier: Apache-2.0
package tariff.correction;

import java.util.ArrayList;
import java.util.List;
import java.util.TreeMap;

/** What outputs a set of steps can give; steps of one size are as good as each other and only counted. */
final class Combinations {
    static final int MOST = 4096;

    private final long[] sizes;
    private final List<int[]> counts = new ArrayList<>();
    private final long[] outputs;

    /** @throws IllegalArgumentException if there are more than {@value #MOST} */
    Combinations(long[] steps) {
        TreeMap<Long, Integer> available = new TreeMap<>();
        for (long step : steps) {
            available.merge(step, 1, Integer::sum);
        }
        long number = available.values().stream().mapToLong(count -> count + 1L).reduce(1, (a, b) -> a * b);
        if (number > MOST) {
            throw new IllegalArgumentException(number + " combinations of steps; allowed: " + MOST);
        }
        sizes = available.keySet().stream().mapToLong(Long::longValue).toArray();
        int[] limits = available.values().stream().mapToInt(Integer::intValue).toArray();
        add(new int[sizes.length], 0, limits);
        outputs = counts.stream().mapToLong(this::output).toArray();
    }

    private void add(int[] chosen, int size, int[] limits) {
        if (size == limits.length) {
            counts.add(chosen.clone());
            return;
        }
        for (int count = 0; count <= limits[size]; count++) {
            chosen[size] = count;
            add(chosen, size + 1, limits);
        }
        chosen[size] = 0;
    }

    /** How many steps of each size are on in the combination that is first: none. */
    int[] none() {
        return counts.get(0);
    }

    long[] sizes() {
        return sizes.clone();
    }

    long output(int[] on) {
        long sum = 0;
        for (int i = 0; i < sizes.length; i++) {
            sum += on[i] * sizes[i];
        }
        return sum;
    }

    static int operations(int[] from, int[] to) {
        int sum = 0;
        for (int i = 0; i < from.length; i++) {
            sum += Math.abs(from[i] - to[i]);
        }
        return sum;
    }

    /** The combination nearest the wanted output that the allowed operations reach; then the fewest operations, then less. */
    int[] nearest(long wanted, int[] from, int allowed) {
        int[] best = from;
        long bestOutput = output(from);
        int bestOperations = 0;
        for (int i = 0; i < outputs.length; i++) {
            long gain = Math.abs(wanted - bestOutput) - Math.abs(wanted - outputs[i]);
            int operations = gain < 0 ? Integer.MAX_VALUE : operations(from, counts.get(i));
            boolean less = operations == bestOperations && outputs[i] < bestOutput;
            if (operations <= allowed && (gain > 0 || (gain == 0 && (operations < bestOperations || less)))) {
                best = counts.get(i);
                bestOutput = outputs[i];
                bestOperations = operations;
            }
        }
        return best;
    }
}
