package org.saddlebook.spontaneity.internal;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import org.saddlebook.api.findings.Node;
import org.saddlebook.api.model.StandardState;
import org.saddlebook.api.quantity.Constants;
import org.saddlebook.api.quantity.Dimension;
import org.saddlebook.reaction.api.Fraction;
import org.saddlebook.reaction.api.Phase;
import org.saddlebook.reaction.api.Species;
import org.saddlebook.units.api.UnitException;
import org.saddlebook.units.api.Units;

/**
 * Temperature against equilibrium constant, as stated in the campaign.
 *
 * @param kelvin temperatures, K
 * @param lnK ln of the constant, in the stated standard state
 * @param uncertainty standard uncertainties of ln K; empty where not stated for every row
 * @param kind Kp, Kc, Kx or molal, as stated
 * @param standardState of the results, for people
 * @param converted whether a Kc of gases was turned into a Kp at 1 bar
 * @param calorimetric an enthalpy measured in another way; empty for none
 * @param gases products minus reactants in the gas; empty where no equation is stated
 */
record EquilibriumTable(
        List<Double> kelvin,
        List<Double> lnK,
        Optional<List<Double>> uncertainty,
        String kind,
        String standardState,
        boolean converted,
        Optional<Calorimetric> calorimetric,
        OptionalDouble gases) {
    private static final List<String> KEYS = List.of("kind", "standardState", "reaction", "rows", "dH");
    private static final List<String> FORMS = List.of("K", "lnK", "pK");

    /** ln 10, so that pK = −ln K / ln 10. */
    private static final double LN_10 = StrictMath.log(10);

    /**
     * An enthalpy of reaction from calorimetry.
     *
     * @param kelvin temperature at which it was measured, K
     * @param enthalpy J/mol
     * @param uncertainty standard uncertainty, J/mol
     */
    record Calorimetric(double kelvin, double enthalpy, double uncertainty) {}

    static EquilibriumTable read(Node node) throws Refusal {
        SettingsReader settings = new SettingsReader(node, "the equilibrium table", KEYS);
        String kind = settings.text("kind").orElse("");
        if (!List.of("Kp", "Kc", "Kx", "molal").contains(kind)) {
            throw new Refusal("The equilibrium table must say its kind: Kp, Kc, Kx or molal.");
        }
        String standard = standard(kind, settings.text("standardState"));
        double gases = gases(settings.text("reaction"));
        boolean convert = kind.equals("Kc") && gases != 0;
        if (settings.node("rows").isEmpty()
                || !(settings.node("rows").get() instanceof Node.Items rows)
                || rows.items().size() < 2) {
            throw new Refusal(
                    "The equilibrium table needs rows: at least two, each with temperature and K, lnK or pK.");
        }
        int n = rows.items().size();
        List<Double> t = new ArrayList<>();
        List<Double> lnK = new ArrayList<>();
        List<Double> u = new ArrayList<>();
        for (int i = 0; i < n; i++) {
            SettingsReader row = new SettingsReader(
                    rows.items().get(i),
                    "row " + (i + 1) + " of the equilibrium table",
                    List.of("temperature", "K", "lnK", "pK", "u"));
            double kelvin = row.kelvin("temperature");
            t.add(kelvin);
            lnK.add(constant(row, i) + (convert ? gases * StrictMath.log(molarPressure(standard, kelvin)) : 0));
            OptionalDouble one = row.scalar("u");
            if (one.isPresent()) {
                if (!(one.getAsDouble() > 0)) {
                    throw new Refusal("In row " + (i + 1)
                            + " of the equilibrium table u must be above zero: the standard uncertainty of ln K.");
                }
                u.add(one.getAsDouble());
            }
        }
        boolean stated = u.size() == n;
        if (!u.isEmpty() && !stated) {
            throw new Refusal(
                    "Some rows of the equilibrium table state u and some do not; state it for all or for none.");
        }
        Optional<Calorimetric> calorimetric = calorimetric(settings, stated);
        return new EquilibriumTable(
                List.copyOf(t),
                List.copyOf(lnK),
                stated ? Optional.of(List.copyOf(u)) : Optional.empty(),
                kind,
                convert ? "1 bar" : standard,
                convert,
                calorimetric,
                settings.text("reaction").isPresent() ? OptionalDouble.of(gases) : OptionalDouble.empty());
    }

    /** The standard state of the constants, where it is a pressure or a concentration. */
    StandardState standard() throws Refusal {
        if (!kind.equals("Kp") && !kind.equals("Kc")) {
            throw new Refusal("Amounts and rates need a Kp or a Kc; " + kind + " has another standard state.");
        }
        try {
            return Units.standardState(standardState);
        } catch (UnitException wrong) {
            throw new Refusal("The standard state of the equilibrium table cannot be used: " + wrong.found() + ".");
        }
    }

    private static double constant(SettingsReader row, int i) throws Refusal {
        List<String> found = new ArrayList<>();
        for (String form : FORMS) {
            if (row.node(form).isPresent()) {
                found.add(form);
            }
        }
        String where = "Row " + (i + 1) + " of the equilibrium table";
        if (found.size() != 1) {
            throw new Refusal(where + " must have one of K, lnK and pK.");
        }
        double value = row.scalar(found.get(0)).orElseThrow();
        if (found.get(0).equals("K")) {
            if (!(value > 0)) {
                throw new Refusal(where + ": K must be above zero.");
            }
            return StrictMath.log(value);
        }
        return found.get(0).equals("pK") ? -value * LN_10 : value;
    }

    private static String standard(String kind, Optional<String> stated) throws Refusal {
        if (kind.equals("Kx")) {
            if (stated.isPresent() && !stated.get().equals("mole fraction")) {
                throw new Refusal("Kx has the standard state \"mole fraction\"; leave standardState out.");
            }
            return "mole fraction";
        }
        String example = kind.equals("Kp") ? "1 bar" : kind.equals("Kc") ? "1 mol/L" : "1 mol/kg";
        if (stated.isEmpty()) {
            throw new Refusal(
                    kind + " has a number only in a standard state; state standardState, such as " + example + ".");
        }
        if (kind.equals("molal")) {
            if (!stated.get().replace(" ", "").equals("1mol/kg")) {
                throw new Refusal("A molal constant has the standard state 1 mol/kg; found " + stated.get() + ".");
            }
            return "1 mol/kg";
        }
        StandardState state;
        try {
            state = Units.standardState(stated.get());
        } catch (UnitException wrong) {
            throw new Refusal(
                    "The standard state of the equilibrium table cannot be used: found " + wrong.found() + ".");
        }
        boolean fits = (state.kind() == StandardState.Kind.PRESSURE) == kind.equals("Kp");
        if (!fits) {
            throw new Refusal(
                    kind + " cannot have the standard state " + stated.get() + "; state one such as " + example + ".");
        }
        return Units.text(state);
    }

    /** Products minus reactants in the gas. */
    private static double gases(Optional<String> reaction) throws Refusal {
        double sum = 0;
        if (reaction.isPresent()) {
            for (Map.Entry<Species, Fraction> one :
                    ReactionRequest.equation(reaction.get()).net().entrySet()) {
                if (one.getKey().phase().isPresent() && one.getKey().phase().get() == Phase.GAS) {
                    sum += one.getValue().doubleValue();
                }
            }
        }
        return sum;
    }

    /** c° R T over 1 bar: the factor from Kc to Kp for one mole of gas. */
    private static double molarPressure(String standard, double kelvin) throws Refusal {
        try {
            return Units.standardState(standard).value() * Constants.GAS * kelvin / StandardState.ONE_BAR.value();
        } catch (UnitException wrong) {
            throw new Refusal("The standard state of the equilibrium table cannot be used: " + wrong.found() + ".");
        }
    }

    private static Optional<Calorimetric> calorimetric(SettingsReader settings, boolean uncertaintiesStated)
            throws Refusal {
        if (settings.node("dH").isEmpty()) {
            return Optional.empty();
        }
        SettingsReader.Si h = settings.quantity("dH", Dimension.MOLAR_ENERGY, "kJ/mol");
        if (h.uncertainty().isEmpty() || !(h.uncertainty().getAsDouble() > 0) || !uncertaintiesStated) {
            throw new Refusal(
                    "To fit a calorimetric dH together with the constants, state the standard uncertainty of dH and"
                            + " u of every row: without them there is no way to weigh one against the other.");
        }
        return Optional.of(new Calorimetric(
                Constants.REFERENCE_KELVIN, h.value(), h.uncertainty().getAsDouble()));
    }
}
