package org.saddlebook.console.internal;

import java.io.PrintStream;
import java.util.OptionalDouble;
import org.osgi.service.component.annotations.Component;
import org.saddlebook.api.problem.InputException;
import org.saddlebook.api.problem.Place;
import org.saddlebook.api.quantity.Unit;
import org.saddlebook.console.api.ExitCode;
import org.saddlebook.console.api.Invocation;
import org.saddlebook.console.api.Options;
import org.saddlebook.console.api.Verb;
import org.saddlebook.presentation.api.Rounding;
import org.saddlebook.presentation.api.UnitText;
import org.saddlebook.units.api.ListedUnit;
import org.saddlebook.units.api.UnitException;
import org.saddlebook.units.api.Units;

/** Lists the units that are understood, or explains one expression. */
@Component(property = Verb.NAME_PROPERTY + "=units")
public final class UnitsVerb implements Verb {
    @Override
    public String name() {
        return "units";
    }

    @Override
    public String synopsis() {
        return "[EXPRESSION]";
    }

    @Override
    public String summary() {
        return "lists the units that are understood, or explains one expression";
    }

    @Override
    public String help() {
        return "EXPRESSION  a unit as it stands in a header, for example \"L mol-1 s-1\"";
    }

    @Override
    public int run(Invocation invocation) throws InputException {
        Options options = Options.parse(invocation.arguments(), java.util.List.of(), java.util.List.of());
        PrintStream out = invocation.out();
        if (!options.words().isEmpty()) {
            explain(out, options.word("EXPRESSION"));
            return ExitCode.DONE;
        }
        int width = 0;
        for (ListedUnit listed : Units.list()) {
            width = Math.max(width, listed.unit().code().length());
        }
        for (ListedUnit listed : Units.list()) {
            out.println(Lines.padded(listed.unit().code(), width + 2)
                    + listed.name()
                    + ", " + listed.dimension()
                    + (listed.prefixes() ? ", with SI prefixes" : "")
                    + (listed.spellings().isEmpty() ? "" : "; also " + String.join(", ", listed.spellings())));
        }
        out.println();
        out.println("Units are combined as in L/(mol.s), L mol-1 s-1, L·mol⁻¹·s⁻¹ or cm^3 molecule^-1 s^-1.");
        return ExitCode.DONE;
    }

    private static void explain(PrintStream out, String expression) throws InputException {
        try {
            Unit unit = Units.parse(expression);
            out.println(unit.code() + "  " + Units.name(unit.dimension()));
            out.println("  shown as " + UnitText.forPeople(unit.code()));
            out.println("  1 of it is " + Rounding.shortest(unit.factor()) + " in SI units"
                    + (unit.offset() == 0 ? "" : ", counted from " + Rounding.shortest(unit.offset())));
            OptionalDouble order = Units.rateOrder(unit);
            if (order.isPresent()) {
                out.println(
                        "  as the unit of a rate constant: overall order " + Rounding.shortest(order.getAsDouble()));
            }
        } catch (UnitException e) {
            throw new InputException(e.at(Place.of("EXPRESSION")));
        }
    }
}
