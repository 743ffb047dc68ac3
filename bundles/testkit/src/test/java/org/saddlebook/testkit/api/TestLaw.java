package org.saddlebook.testkit.api;

import java.util.List;
import java.util.Optional;
import org.saddlebook.api.model.Derived;
import org.saddlebook.api.model.HeldParameters;
import org.saddlebook.api.model.Inapplicable;
import org.saddlebook.api.model.ModelDescription;
import org.saddlebook.api.model.Parameter;
import org.saddlebook.api.model.RateContext;
import org.saddlebook.api.model.RateFunction;
import org.saddlebook.api.model.RateModel;
import org.saddlebook.api.quantity.Dimension;
import org.saddlebook.api.quantity.Unit;

/** A sound law, {@code ln k = ln A − B/T}, whose parts a test replaces by faulty ones. */
class TestLaw implements RateModel, RateFunction {
    static final Unit PER_SECOND = new Unit("/s", Dimension.rateConstant(1), 1, 0);
    static final RateContext CONTEXT = RateContext.of(PER_SECOND, 1);

    private RateContext bound = CONTEXT;

    RateContext bound() {
        return bound;
    }

    @Override
    public String id() {
        return "test.law";
    }

    @Override
    public ModelDescription description() {
        return new ModelDescription("Test law", "ln k = ln A - B/T", "made for tests", Optional.empty());
    }

    @Override
    public RateFunction bind(RateContext context) throws Inapplicable {
        bound = context;
        return HeldParameters.of(context, this);
    }

    @Override
    public List<Parameter> parameters() {
        return List.of(
                Parameter.log("A", "pre-exponential factor", bound.rateUnit()),
                Parameter.linear("B", "activation temperature", Unit.KELVIN));
    }

    @Override
    public boolean linear() {
        return true;
    }

    @Override
    public double lnRate(double kelvin, double[] p, double[] gradient) {
        gradient[0] = 1;
        gradient[1] = -1 / kelvin;
        return p[0] - p[1] / kelvin;
    }

    @Override
    public List<Derived> derived() {
        return List.of(
                new Derived("Bhalf", "half of it", Unit.KELVIN, Parameter.Scale.LINEAR, (kelvin, p, gradient) -> {
                    gradient[0] = 0;
                    gradient[1] = 0.5;
                    return p[1] / 2;
                }));
    }
}
