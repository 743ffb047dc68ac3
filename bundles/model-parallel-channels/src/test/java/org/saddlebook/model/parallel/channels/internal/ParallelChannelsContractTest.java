package org.saddlebook.model.parallel.channels.internal;

import java.util.List;
import org.saddlebook.api.model.RateContext;
import org.saddlebook.api.model.RateModel;
import org.saddlebook.api.model.StandardState;
import org.saddlebook.api.quantity.Dimension;
import org.saddlebook.api.quantity.Unit;
import org.saddlebook.testkit.api.Example;
import org.saddlebook.testkit.api.RateModelContract;

class ParallelChannelsContractTest extends RateModelContract {
    private static final Unit PER_SECOND = new Unit("/s", Dimension.rateConstant(1), 1, 0);
    private static final Unit MOLAR_PER_SECOND = new Unit("L/(mol.s)", Dimension.rateConstant(2), 1e-3, 0);
    private static final Unit ZEROTH_ORDER = new Unit("mol/(L.s)", Dimension.rateConstant(0), 1e3, 0);

    @Override
    protected RateModel model() {
        return new ParallelChannels();
    }

    @Override
    protected List<Example> examples() {
        return List.of(
                Example.of(RateContext.of(PER_SECOND, 1), 8, 40_000, 30, 100_000),
                Example.of(RateContext.of(MOLAR_PER_SECOND, 2).withTransmission(0.4), -2, -5_000, 17, 42_000),
                Example.of(
                                RateContext.of(MOLAR_PER_SECOND, 2).withStandard(StandardState.ONE_BAR),
                                12,
                                60_000,
                                25,
                                260_000)
                        .between(500, 2500),
                Example.of(RateContext.of(ZEROTH_ORDER, 0), 8, 40_000, 20, 60_000),
                Example.of(RateContext.of(PER_SECOND, 1).withFixed("Ea1", 40_000), 8, 30, 100_000));
    }
}
