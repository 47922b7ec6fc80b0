// SPDX-License-Identifier: Apache-2.0
package tariff.csv;

import tariff.meter.Register;

/** A heading of a quantity that names no unit: energy has a usual one, demand has none. */
final class UnitlessHeading {
    private UnitlessHeading() {}

    static Heading of(String name, Parsed parsed) {
        if (parsed.says(Word.DEMAND)
                || (parsed.says(Word.PEAK) && parsed.window().isEmpty())) {
            return parsed.rest().isEmpty()
                    ? Heading.doubtful(name, "it does not say whether kW, kVA or kvar; write the unit into the name")
                    : Heading.ignored(name, "not known");
        }
        boolean reactive = parsed.says(Word.REACTIVE) || parsed.says(Word.LAGGING) || parsed.says(Word.LEADING);
        if (!parsed.rest().isEmpty() || (!reactive && !parsed.says(Word.ENERGY))) {
            return Heading.ignored(name, "not known");
        }
        if (parsed.says(Word.PART_OF_DAY)) {
            return Heading.doubtful(name, "it names a part of the day that is no window of the rate");
        }
        if (parsed.says(Word.EXPORT) || (parsed.says(Word.LAGGING) && parsed.says(Word.LEADING))) {
            return Heading.doubtful(name, "it does not say which way the energy flows; write the unit into the name");
        }
        Register register = !reactive
                ? Register.ENERGY_KWH
                : parsed.says(Word.LEADING) ? Register.LEADING_KVARH : Register.LAGGING_KVARH;
        return HeadingReader.finish(name, parsed, register)
                .rank(1)
                .remark("unit-assumed", "names no unit and is read as " + register.words());
    }
}
