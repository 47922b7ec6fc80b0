// SPDX-License-Identifier: Apache-2.0
package tariff.payback;

import java.util.Optional;
import java.util.function.Function;

/**
 * A measure that has a value, or a sentence that says why it has none.
 *
 * @param <T> the type of the value
 */
public sealed interface Answer<T> {

    /** The measure exists. */
    record Known<T>(T value) implements Answer<T> {
        @Override
        public <R> R fold(Function<? super T, ? extends R> known, Function<String, ? extends R> notApplicable) {
            return known.apply(value);
        }
    }

    /**
     * The measure does not exist for these flows.
     *
     * @param reason a sentence without its full stop, for a person
     */
    record NotApplicable<T>(String reason) implements Answer<T> {
        @Override
        public <R> R fold(Function<? super T, ? extends R> known, Function<String, ? extends R> notApplicable) {
            return notApplicable.apply(reason);
        }
    }

    /** One result from either case. */
    <R> R fold(Function<? super T, ? extends R> known, Function<String, ? extends R> notApplicable);

    static <T> Answer<T> known(T value) {
        return new Known<>(value);
    }

    static <T> Answer<T> notApplicable(String reason) {
        return new NotApplicable<>(reason);
    }

    default <R> Answer<R> map(Function<? super T, ? extends R> change) {
        return flatMap(value -> new Known<R>(change.apply(value)));
    }

    default <R> Answer<R> flatMap(Function<? super T, Answer<R>> change) {
        return this.<Answer<R>>fold(change, NotApplicable::new);
    }

    /** The value alone, for a reader that does not need the reason. */
    default Optional<T> optional() {
        return this.<Optional<T>>fold(Optional::of, reason -> Optional.empty());
    }
}
