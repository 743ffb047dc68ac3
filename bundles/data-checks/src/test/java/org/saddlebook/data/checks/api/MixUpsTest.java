package org.saddlebook.data.checks.api;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.util.List;
import org.junit.jupiter.api.Test;
import org.saddlebook.api.quantity.Unit;
import org.saddlebook.units.api.UnitException;
import org.saddlebook.units.api.Units;

/** Shifts of entropy: R ln 60 = 34.0, R ln 3600 = 68.1, R ln 1000 = 57.4, R ln 6.02214076e20 = 398 J/(mol K), by hand. */
class MixUpsTest {
    private static MixUp of(String unit, double order, String id) throws UnitException {
        return MixUps.of(Units.parse(unit), order).stream()
                .filter(each -> each.id().equals(id))
                .findFirst()
                .orElseThrow();
    }

    @Test
    void derivesTheShiftsOfTheTradeFromTheUnit() throws UnitException {
        assertEquals(-34.04, of("s-1", 1, "unit-min-1").entropyShift(), 0.005);
        assertEquals(-68.08, of("s-1", 1, "unit-h-1").entropyShift(), 0.005);
        assertEquals(57.43, of("L/(mol.s)", 2, "unit-L/(mol.ms)").entropyShift(), 0.005);
        assertEquals(397.82, of("L/(mol.s)", 2, "unit-cm3/({molecule}.s)").entropyShift(), 0.005);
        assertEquals(-397.82, of("L/(mol.s)", 2, "twice-cm3/({molecule}.s)").entropyShift(), 0.005);
        assertEquals(-340.39, of("cm3/({molecule}.s)", 2, "unit-L/(mmol.s)").entropyShift(), 0.005);
    }

    @Test
    void comparesWithTheUnitThatIsStated() throws UnitException {
        assertEquals(StrictMath.log(60), of("h-1", 1, "unit-min-1").lnFactor(), 1e-12);
        assertEquals(StrictMath.log(3600), of("h-1", 1, "unit-s-1").lnFactor(), 1e-12);
        assertTrue(MixUps.of(Units.parse("h-1"), 1).stream()
                .noneMatch(each -> each.id().equals("unit-h-1")));
    }

    @Test
    void everyMixUpHasItsReverse() throws UnitException {
        for (String unit : List.of("s-1", "min-1", "L/(mol.s)", "cm3/({molecule}.s)", "mol/(L.s)")) {
            Unit parsed = Units.parse(unit);
            List<MixUp> all = MixUps.of(parsed, Units.rateOrder(parsed).getAsDouble());
            for (MixUp mixUp : all) {
                assertEquals(
                        1,
                        all.stream()
                                .filter(each -> Math.abs(each.lnFactor() + mixUp.lnFactor()) < 1e-9)
                                .count(),
                        unit + " " + mixUp);
            }
        }
    }

    @Test
    void namesUnitsThatTheUnitsBundleReads() throws UnitException {
        for (MixUp mixUp : MixUps.of(Units.parse("L/(mol.s)"), 2)) {
            if (!mixUp.unit().isEmpty()) {
                double factor = Units.rateConstant(mixUp.unit()).factor() / 1e-3;
                assertEquals(mixUp.lnFactor(), StrictMath.log(factor), 1e-9, mixUp.toString());
            }
        }
    }

    @Test
    void refusesAnOrderThatIsNotTheUnits() {
        assertThrows(IllegalArgumentException.class, () -> MixUps.of(Units.parse("s-1"), 2));
    }

    @Test
    void explainsADifferenceByAMixUpOnlyWhereItFits() throws UnitException {
        List<MixUp> mixUps = MixUps.of(Units.parse("s-1"), 1);
        ShiftTest.Explained minutes =
                ShiftTest.explain(StrictMath.log(62), 0.05, 6, mixUps).orElseThrow();
        assertEquals("unit-min-1", minutes.mixUp().id());
        assertTrue(minutes.probability() > 0.9);
        assertTrue(ShiftTest.explain(0.1, 0.05, 6, mixUps).isEmpty());
        assertTrue(ShiftTest.explain(StrictMath.log(5), 0.05, 6, mixUps).isEmpty());
        assertThrows(IllegalArgumentException.class, () -> ShiftTest.explain(Double.NaN, 1, 1, mixUps));
    }
}
