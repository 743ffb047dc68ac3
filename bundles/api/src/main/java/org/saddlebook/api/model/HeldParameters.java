package org.saddlebook.api.model;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;

/**
 * Holds parameters of a law at the values a context fixes. A model writes its law once, with all parameters free, and
 * ends {@link RateModel#bind} with {@code return HeldParameters.of(context, law);}.
 */
public final class HeldParameters implements RateFunction {
    private final RateFunction law;
    private final double[] template;
    private final int[] free;
    private final List<Parameter> parameters;
    private final List<Derived> derived;

    private HeldParameters(RateFunction law, double[] template, int[] free) {
        this.law = law;
        this.template = template;
        this.free = free;
        List<Parameter> all = law.parameters();
        List<Parameter> rest = new ArrayList<>();
        for (int index : free) {
            rest.add(all.get(index));
        }
        parameters = List.copyOf(rest);
        List<Derived> carried = new ArrayList<>();
        for (Derived d : law.derived()) {
            carried.add(new Derived(d.symbol(), d.name(), d.unit(), d.scale(), (kelvin, p, gradient) -> {
                double[] whole = new double[template.length];
                double value = d.function().value(kelvin, expand(p), whole);
                reduce(whole, gradient);
                return value;
            }));
        }
        derived = List.copyOf(carried);
    }

    /**
     * The law with every parameter that the context fixes held at its value; the law itself when it fixes none.
     *
     * @param law the law with all its parameters free
     * @throws Inapplicable when the context fixes a parameter that the law does not have, a value outside the parameter's
     *     bounds, or every parameter
     */
    public static RateFunction of(RateContext context, RateFunction law) throws Inapplicable {
        List<Parameter> all = law.parameters();
        double[] template = new double[all.size()];
        int[] free = new int[all.size()];
        int freeCount = 0;
        int heldCount = 0;
        for (int i = 0; i < template.length; i++) {
            Parameter parameter = all.get(i);
            OptionalDouble value = context.fixed(parameter.symbol());
            if (value.isEmpty()) {
                free[freeCount++] = i;
                continue;
            }
            heldCount++;
            template[i] = value.getAsDouble();
            if (!Double.isFinite(template[i])
                    || !(template[i] >= parameter.lower())
                    || !(template[i] <= parameter.upper())) {
                throw new Inapplicable("The value at which " + parameter.symbol() + " (" + parameter.name()
                        + ") is to be held lies outside its bounds.");
            }
        }
        if (heldCount < context.fixed().size()) {
            throw new Inapplicable("The law has no parameter " + unknown(context, all) + " that could be held.");
        }
        if (heldCount == 0) {
            return law;
        }
        if (freeCount == 0) {
            throw new Inapplicable("Every parameter is held, so nothing is left to determine.");
        }
        int[] kept = new int[freeCount];
        System.arraycopy(free, 0, kept, 0, freeCount);
        return new HeldParameters(law, template, kept);
    }

    private static String unknown(RateContext context, List<Parameter> all) {
        List<String> symbols = new ArrayList<>(context.fixed().keySet());
        for (Parameter parameter : all) {
            symbols.remove(parameter.symbol());
        }
        symbols.sort(null);
        return String.join(", ", symbols);
    }

    private double[] expand(double[] p) {
        double[] whole = template.clone();
        for (int i = 0; i < free.length; i++) {
            whole[free[i]] = p[i];
        }
        return whole;
    }

    private void reduce(double[] whole, double[] gradient) {
        for (int i = 0; i < free.length; i++) {
            gradient[i] = whole[free[i]];
        }
    }

    @Override
    public List<Parameter> parameters() {
        return parameters;
    }

    @Override
    public boolean linear() {
        return law.linear();
    }

    @Override
    public double lnRate(double kelvin, double[] p, double[] gradient) {
        double[] whole = new double[template.length];
        double value = law.lnRate(kelvin, expand(p), whole);
        reduce(whole, gradient);
        return value;
    }

    @Override
    public double lnRate(double kelvin, Conditions at, double[] p, double[] gradient) {
        double[] whole = new double[template.length];
        double value = law.lnRate(kelvin, at, expand(p), whole);
        reduce(whole, gradient);
        return value;
    }

    @Override
    public boolean defined(double kelvin, double[] p) {
        return law.defined(kelvin, expand(p));
    }

    @Override
    public List<double[]> starts(double[] kelvin, double[] lnRate) {
        return kept(law.starts(kelvin, lnRate));
    }

    @Override
    public List<double[]> starts(double[] kelvin, List<Conditions> at, double[] lnRate) {
        return kept(law.starts(kelvin, at, lnRate));
    }

    @Override
    public double[] ordered(double[] p) {
        // With one of them held, the parameters can no longer change places.
        return p;
    }

    @Override
    public List<String> remarks(double[] p) {
        return law.remarks(expand(p));
    }

    private List<double[]> kept(List<double[]> starts) {
        List<double[]> kept = new ArrayList<>();
        for (double[] start : starts) {
            double[] rest = new double[free.length];
            reduce(start, rest);
            kept.add(rest);
        }
        return kept;
    }

    @Override
    public List<Derived> derived() {
        return derived;
    }
}
