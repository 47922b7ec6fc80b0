// SPDX-License-Identifier: Apache-2.0
package tariff.rate.clause;

import java.math.BigDecimal;
import java.time.LocalDate;
import java.util.List;
import java.util.Optional;
import tariff.meter.Cut;
import tariff.meter.CutEnergies;
import tariff.meter.Period;
import tariff.meter.Register;
import tariff.meter.Unit;
import tariff.notice.Assumption;

/** What a clause may ask of the month that is billed. */
public interface Facts {

    Period period();

    /** The day printed on the bill, or the last day billed where none is. */
    LocalDate statementDate();

    /**
     * A register, of the whole period or of a window.
     *
     * @throws MissingReading if it was not read and cannot be derived
     */
    Figure register(Register register, Optional<String> window);

    /** Whether the register was read, or can be derived. */
    boolean has(Register register, Optional<String> window);

    /**
     * A figure agreed between site and utility.
     *
     * @throws MissingReading if the site gives none
     */
    Figure agreed(Unit unit);

    boolean option(String name);

    /** A quantity that the rate defines by name. */
    Figure named(String name);

    /** A power factor that the rate defines by name; empty in a month without energy, when it has no meaning. */
    Optional<Figure> powerFactor(String name);

    /** The amount of another line of the same month. */
    BigDecimal amount(String line);

    /** Shares of the period's days by season name, adding up to 1. */
    List<SeasonShare> seasons();

    /** The months before this one, the latest first; may be fewer than a clause would like. */
    List<? extends Facts> earlier();

    /**
     * The same questions for each hour, day … of the period.
     *
     * @throws MissingReading if only totals of the period are known
     */
    List<? extends Facts> each(Cut cut);

    /** The energies of each hour, day … of the period in whole numbers, where interval data give them. */
    Optional<CutEnergies> energies(Cut cut);

    /** Notes something taken to be so because the data do not say. */
    void assume(Assumption assumption);

    /** A season and the share of the period that lies in it. */
    record SeasonShare(String season, BigDecimal share) {}
}
