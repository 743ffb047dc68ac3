package org.saddlebook.model.modified.arrhenius.internal;

import java.util.List;
import java.util.Optional;
import org.saddlebook.api.model.RateContext;
import org.saddlebook.api.model.RateModel;
import org.saddlebook.api.model.StandardState;
import org.saddlebook.api.quantity.Dimension;
import org.saddlebook.api.quantity.Unit;
import org.saddlebook.model.arrhenius.internal.Arrhenius;
import org.saddlebook.testkit.api.Example;
import org.saddlebook.testkit.api.RateModelContract;

class ModifiedArrheniusContractTest extends RateModelContract {
    private static final Unit PER_SECOND = new Unit("/s", Dimension.rateConstant(1), 1, 0);
    private static final Unit MOLAR_PER_SECOND = new Unit("L/(mol.s)", Dimension.rateConstant(2), 1e-3, 0);
    private static final Unit THIRD_ORDER = new Unit("L2/(mol2.s)", Dimension.rateConstant(3), 1e-6, 0);
    private static final Unit ZEROTH_ORDER = new Unit("mol/(L.s)", Dimension.rateConstant(0), 1e3, 0);

    @Override
    protected RateModel model() {
        return new ModifiedArrhenius();
    }

    @Override
    protected List<Example> examples() {
        return List.of(
                Example.of(RateContext.of(PER_SECOND, 1), 30, 1.5, 85_000),
                Example.of(RateContext.of(MOLAR_PER_SECOND, 2).withTransmission(0.4), 17, -2, 42_000),
                Example.of(
                                RateContext.of(MOLAR_PER_SECOND, 2)
                                        .withStandard(StandardState.ONE_BAR)
                                        .withReferenceKelvin(1000),
                                18,
                                2.6,
                                9_000)
                        .between(200, 2500),
                Example.of(RateContext.of(THIRD_ORDER, 3).withStandard(StandardState.ONE_BAR), 2, -1, 9_000),
                Example.of(RateContext.of(ZEROTH_ORDER, 0), 20, 0.5, 60_000),
                Example.of(RateContext.of(PER_SECOND, 1).withFixed("n", 0.5), 30, 85_000));
    }

    @Override
    protected Optional<RateModel> contained() {
        return Optional.of(new Arrhenius());
    }
}
