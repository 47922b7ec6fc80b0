// SPDX-License-Identifier: Apache-2.0
package tariff.service.request;

import jakarta.validation.ConstraintViolation;
import jakarta.validation.Path;
import jakarta.validation.Validation;
import jakarta.validation.Validator;
import java.math.BigDecimal;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.stream.Stream;
import org.hibernate.validator.messageinterpolation.ParameterMessageInterpolator;
import tariff.notice.Finding;
import tariff.notice.Refusal;

/** Findings from the ranges that a record declares on its components; a constraint's message says what is allowed. */
public final class Declared {
    private static final Validator VALIDATOR = Validation.byDefaultProvider()
            .configure()
            .messageInterpolator(new ParameterMessageInterpolator())
            .buildValidatorFactory()
            .getValidator();

    private Declared() {}

    /**
     * The terms themselves.
     *
     * @throws Refusal with every range that they leave
     */
    public static <T> T require(T terms) {
        List<Finding> findings = check(terms, "");
        if (!findings.isEmpty()) {
            throw new Refusal(findings);
        }
        return terms;
    }

    /** The terms, unless they leave a range; what they leave is added to the findings. */
    static <T> Optional<T> sound(T terms, String pointer, List<Finding> findings) {
        List<Finding> found = check(terms, pointer);
        findings.addAll(found);
        return found.isEmpty() ? Optional.of(terms) : Optional.empty();
    }

    static <T> List<Finding> check(T terms, String pointer) {
        return VALIDATOR.validate(terms).stream()
                .map(violation -> finding(violation, pointer))
                .sorted(Comparator.comparing(Finding::where).thenComparing(Finding::message))
                .toList();
    }

    private static Finding finding(ConstraintViolation<?> violation, String pointer) {
        Object value = violation.getInvalidValue();
        boolean number = value instanceof BigDecimal || value instanceof Integer;
        Finding finding = Finding.error(
                        "range",
                        pointer + (number ? place(violation) : ""),
                        number ? "is out of range" : "does not hold together")
                .allowed(violation.getMessage());
        return number ? finding.found(String.valueOf(value)) : finding;
    }

    private static String place(ConstraintViolation<?> violation) {
        StringBuilder place = new StringBuilder();
        for (Path.Node node : violation.getPropertyPath()) {
            Stream.of(node.getIndex())
                    .filter(index -> index != null)
                    .forEach(index -> place.append('/').append(index));
            if (!String.valueOf(node.getName()).startsWith("<")) {
                place.append('/').append(node.getName());
            }
        }
        return place.toString();
    }
}
