package org.saddlebook.model.eyring.internal;

import java.util.List;
import org.saddlebook.api.model.RateContext;
import org.saddlebook.api.model.RateModel;
import org.saddlebook.api.model.StandardState;
import org.saddlebook.api.quantity.Dimension;
import org.saddlebook.api.quantity.Unit;
import org.saddlebook.testkit.api.Example;
import org.saddlebook.testkit.api.RateModelContract;

class EyringContractTest extends RateModelContract {
    private static final Unit PER_SECOND = new Unit("/s", Dimension.rateConstant(1), 1, 0);
    private static final Unit MOLAR_PER_SECOND = new Unit("L/(mol.s)", Dimension.rateConstant(2), 1e-3, 0);
    private static final Unit THIRD_ORDER = new Unit("L2/(mol2.s)", Dimension.rateConstant(3), 1e-6, 0);
    private static final Unit ZEROTH_ORDER = new Unit("mol/(L.s)", Dimension.rateConstant(0), 1e3, 0);

    @Override
    protected RateModel model() {
        return new Eyring();
    }

    @Override
    protected List<Example> examples() {
        return List.of(
                Example.of(RateContext.of(PER_SECOND, 1), 85_000, -20),
                Example.of(RateContext.of(MOLAR_PER_SECOND, 2).withTransmission(0.4), 42_000, -110),
                Example.of(RateContext.of(MOLAR_PER_SECOND, 2).withStandard(StandardState.ONE_BAR), -3_000, -140)
                        .between(200, 2500),
                Example.of(RateContext.of(THIRD_ORDER, 3).withStandard(StandardState.ONE_BAR), 9_000, -200),
                Example.of(RateContext.of(new Unit("odd", Dimension.rateConstant(1.5), 1, 0), 1.5), 70_000, 10),
                Example.of(RateContext.of(PER_SECOND, 1).withFixed("dS", -20), 85_000));
    }

    @Override
    protected List<RateContext> inapplicable() {
        return List.of(
                RateContext.of(ZEROTH_ORDER, 0),
                RateContext.of(new Unit("odd", Dimension.rateConstant(0.5), 1, 0), 0.5),
                RateContext.of(PER_SECOND, 1).withFixed("dH", 1e5).withFixed("dS", 0),
                RateContext.of(PER_SECOND, 1).withFixed("dH", Double.NaN));
    }
}
