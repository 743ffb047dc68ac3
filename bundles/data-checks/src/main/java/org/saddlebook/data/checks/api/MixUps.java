package org.saddlebook.data.checks.api;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import org.saddlebook.api.quantity.Constants;
import org.saddlebook.api.quantity.Dimension;
import org.saddlebook.api.quantity.Unit;
import org.saddlebook.presentation.api.UnitText;

/**
 * The mix-ups of a rate constant, derived from its unit: every other unit of the same dimension in which one of time and
 * concentration is another than stated, the conversion that was done once too often, powers of a thousand from the heading
 * of a column, and the decadic for the natural logarithm.
 */
public final class MixUps {
    /** Equal within this they are one mix-up with two names, ln. */
    private static final double SAME = 1e-9;

    private static final Part[] TIMES = {
        new Part("ms", 1e-3), new Part("s", 1), new Part("min", 60), new Part("h", 3600), new Part("d", 86400)
    };

    /** Volume over amount, as it stands in the unit of a constant of order 2: m3/mol in one of it. */
    private static final Part[] VOLUMES = {
        new Part("L/mol", 1e-3),
        new Part("L/mmol", 1),
        new Part("L/umol", 1e3),
        new Part("m3/mol", 1),
        new Part("cm3/mol", 1e-6),
        new Part("cm3/{molecule}", 1e-6 * Constants.AVOGADRO),
    };

    private MixUps() {}

    /** A part of a unit, with its size in SI. */
    private record Part(String code, double si) {}

    /**
     * The mix-ups of constants in this unit, by size of the shift.
     *
     * @param rateUnit unit of a rate constant
     * @param order overall order, from its dimension
     */
    public static List<MixUp> of(Unit rateUnit, double order) {
        if (!rateUnit.dimension().equals(Dimension.rateConstant(order))) {
            throw new IllegalArgumentException("unit " + rateUnit.code() + " is not that of order " + order);
        }
        List<MixUp> all = new ArrayList<>();
        double power = order - 1;
        Part[] volumes = power == 0 ? new Part[] {new Part("", 1)} : VOLUMES;
        // The stated unit as time and volume; one that is written otherwise is compared with s and L/mol.
        Part ownTime = TIMES[1];
        Part ownVolume = volumes[0];
        for (Part time : TIMES) {
            for (Part volume : volumes) {
                if (Math.abs(StrictMath.log(size(time, volume, power) / rateUnit.factor())) < SAME) {
                    ownTime = time;
                    ownVolume = volume;
                }
            }
        }
        double own = size(ownTime, ownVolume, power);
        for (Part time : TIMES) {
            unit(all, time, ownVolume, power, own);
        }
        for (Part volume : volumes) {
            unit(all, ownTime, volume, power, own);
        }
        double thousand = StrictMath.log(1000);
        add(all, "heading-1e-3", "the heading had stood for k in units of 10⁻³", "", -thousand);
        add(all, "heading-1e3", "the heading had stood for 10³ k", "", thousand);
        add(all, "heading-1e-6", "the heading had stood for k in units of 10⁻⁶", "", -2 * thousand);
        add(all, "heading-1e6", "the heading had stood for 10⁶ k", "", 2 * thousand);
        double lnTen = StrictMath.log(StrictMath.log(10));
        add(all, "decadic", "k had been taken from a slope of log10 without the factor 2.303", "", lnTen);
        add(all, "decadic-twice", "the factor 2.303 between log10 and ln had been applied once too often", "", -lnTen);
        all.sort(Comparator.comparingDouble((MixUp mixUp) -> Math.abs(mixUp.lnFactor()))
                .thenComparing(MixUp::id));
        return List.copyOf(all);
    }

    private static double size(Part time, Part volume, double power) {
        return StrictMath.pow(volume.si(), power) / time.si();
    }

    private static void unit(List<MixUp> all, Part time, Part volume, double power, double own) {
        double ln = StrictMath.log(size(time, volume, power) / own);
        if (Math.abs(ln) < SAME) {
            return;
        }
        String code = code(time, volume, power);
        String shown = UnitText.forPeople(code);
        add(all, "unit-" + code, "k had been given in " + shown, code, ln);
        add(
                all,
                "twice-" + code,
                "a conversion from " + shown + " had been applied to numbers that needed none",
                "",
                -ln);
    }

    private static String code(Part time, Part volume, double power) {
        if (power == 0) {
            return time.code() + "-1";
        }
        String[] of = volume.code().split("/", -1);
        if (power == 1) {
            return of[0] + "/(" + of[1] + "." + time.code() + ")";
        }
        if (power == -1) {
            return of[1] + "/(" + of[0] + "." + time.code() + ")";
        }
        return "(" + volume.code() + ")^" + org.saddlebook.presentation.api.Rounding.shortest(power) + "/"
                + time.code();
    }

    /** A factor that is there already gets a second explanation instead of a second place. */
    private static void add(List<MixUp> all, String id, String meaning, String unit, double ln) {
        for (int i = 0; i < all.size(); i++) {
            MixUp known = all.get(i);
            if (Math.abs(known.lnFactor() - ln) < SAME) {
                if (!known.meaning().contains(meaning)) {
                    all.set(
                            i,
                            new MixUp(
                                    known.id(),
                                    known.meaning() + ", or " + meaning,
                                    known.unit().isEmpty() ? unit : known.unit(),
                                    known.lnFactor()));
                }
                return;
            }
        }
        all.add(new MixUp(id, meaning, unit, ln));
    }
}
