package org.saddlebook.model.falloff.internal;

import java.util.List;
import org.saddlebook.api.model.Conditions;
import org.saddlebook.api.model.RateContext;
import org.saddlebook.api.model.RateModel;
import org.saddlebook.api.quantity.Dimension;
import org.saddlebook.api.quantity.Unit;
import org.saddlebook.testkit.api.Example;
import org.saddlebook.testkit.api.RateModelContract;

class TroeContractTest extends RateModelContract {
    private static final Unit PER_SECOND = new Unit("1/s", Dimension.rateConstant(1), 1, 0);
    private static final Unit MOLECULAR = new Unit("cm3/({molecule}.s)", Dimension.rateConstant(2), 6.02214076e17, 0);
    private static final Unit MOLAR = new Unit("L/(mol.s)", Dimension.rateConstant(2), 1e-3, 0);
    private static final Unit THIRD_ORDER = new Unit("L2/(mol2.s)", Dimension.rateConstant(3), 1e-6, 0);

    @Override
    protected RateModel model() {
        return new Troe();
    }

    @Override
    protected List<Example> examples() {
        Conditions thin = Conditions.NONE.with(Conditions.THIRD_BODY, 0.4);
        Conditions dense = Conditions.NONE.with(Conditions.PRESSURE, 1e5);
        return List.of(
                Example.of(RateContext.of(PER_SECOND, 1).withConditions(thin), 34, -1, 90_000, 35, 0.5, 110_000, 0.5),
                Example.of(
                        RateContext.of(MOLECULAR, 2)
                                .withConditions(dense)
                                .withFixed("E0", 0)
                                .withFixed("Einf", 0),
                        9,
                        -3.6,
                        16,
                        -0.5,
                        0.4),
                Example.of(
                        RateContext.of(MOLAR, 2).withConditions(dense).withFixed("n0", 1.5),
                        9,
                        3_000,
                        16,
                        -0.5,
                        1_000,
                        0.9),
                Example.of(
                        RateContext.of(PER_SECOND, 1).withConditions(dense).withFixed("Fc", 0.35),
                        34,
                        -1,
                        90_000,
                        35,
                        1,
                        110_000));
    }

    @Override
    protected List<RateContext> inapplicable() {
        return List.of(RateContext.of(THIRD_ORDER, 3));
    }
}
