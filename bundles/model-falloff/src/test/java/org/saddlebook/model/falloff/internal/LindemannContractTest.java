package org.saddlebook.model.falloff.internal;

import java.util.List;
import org.saddlebook.api.model.Conditions;
import org.saddlebook.api.model.RateContext;
import org.saddlebook.api.model.RateModel;
import org.saddlebook.api.quantity.Dimension;
import org.saddlebook.api.quantity.Unit;
import org.saddlebook.testkit.api.Example;
import org.saddlebook.testkit.api.RateModelContract;

class LindemannContractTest extends RateModelContract {
    private static final Unit PER_SECOND = new Unit("1/s", Dimension.rateConstant(1), 1, 0);
    private static final Unit THIRD_ORDER = new Unit("L2/(mol2.s)", Dimension.rateConstant(3), 1e-6, 0);

    @Override
    protected RateModel model() {
        return new Lindemann();
    }

    @Override
    protected List<Example> examples() {
        Conditions thin = Conditions.NONE.with(Conditions.THIRD_BODY, 0.4);
        Conditions dense = Conditions.NONE.with(Conditions.PRESSURE, 1e5);
        return List.of(
                Example.of(RateContext.of(PER_SECOND, 1).withConditions(thin), 34, -1, 90_000, 35, 0.5, 110_000),
                Example.of(
                        RateContext.of(PER_SECOND, 1).withConditions(dense).withFixed("E0", 0), 5, 3, 35, 0, 110_000),
                Example.of(
                        RateContext.of(PER_SECOND, 1).withConditions(dense).withFixed("ninf", 0.5),
                        34,
                        0.5,
                        90_000,
                        35,
                        110_000));
    }

    @Override
    protected List<RateContext> inapplicable() {
        return List.of(RateContext.of(THIRD_ORDER, 3));
    }
}
