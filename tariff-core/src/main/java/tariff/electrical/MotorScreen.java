// SPDX-License-Identifier: Apache-2.0
package tariff.electrical;

import java.util.Comparator;
import java.util.List;

/** Whether a capacitor could keep a motor excited that is running down. */
final class MotorScreen implements Screen {
    @Override
    public String name() {
        return "motor self-excitation";
    }

    @Override
    public String unit() {
        return "% of the limit";
    }

    @Override
    public String limit() {
        return "90 % of the motor's no-load kvar; none behind a drive or soft starter, none on motors that "
                + "plug, inch or reverse";
    }

    @Override
    public String source() {
        return "90 % rule, IEC 60831-1 guide (from memory); duties from the Electrical Installation Guide 2008, "
                + "ch. L";
    }

    @Override
    public String settledBy() {
        return "the motor maker's own largest safe kvar, which goes before this rule; then a new overload setting";
    }

    @Override
    public Screening ask(SiteData site, BankData bank) {
        Needs needs = new Needs();
        List<Motor> motors =
                needs
                        .of(site.motors(), List.of(), "the motors that will carry capacitors, or word that none will")
                        .stream()
                        .filter(motor -> motor.kvarAtTerminals() > 0)
                        .toList();
        motors.forEach(motor -> needs.of(motor.noLoadAmps(), "the no-load current of motor " + motor.name()));
        if (needs.any()) {
            return notScreened(needs);
        }
        return motors.stream()
                .max(Comparator.comparingDouble(MotorScreen::share))
                .map(this::answer)
                .orElseGet(() -> answer(Verdict.FINE, 0, "no capacitor on a motor's terminals"));
    }

    private Screening answer(Motor motor) {
        double share = share(motor);
        return answer(
                share > 1 ? Verdict.STOP : Verdict.FINE,
                100 * share,
                "motor " + motor.name() + " carries " + Figure.kvar(motor.kvarAtTerminals()) + ", "
                        + Figure.percent(share) + " of the " + Figure.kvar(largestKvar(motor)) + " that it may");
    }

    private static double share(Motor motor) {
        return motor.kvarAtTerminals() / largestKvar(motor);
    }

    private static double largestKvar(Motor motor) {
        return MotorTerminal.largestKvar(motor.volts(), motor.noLoadAmps().orElseThrow());
    }
}
