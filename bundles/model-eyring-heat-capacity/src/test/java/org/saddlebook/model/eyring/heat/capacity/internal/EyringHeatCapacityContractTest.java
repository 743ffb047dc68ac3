package org.saddlebook.model.eyring.heat.capacity.internal;

import java.util.List;
import java.util.Optional;
import org.saddlebook.api.model.RateContext;
import org.saddlebook.api.model.RateModel;
import org.saddlebook.api.model.StandardState;
import org.saddlebook.api.quantity.Dimension;
import org.saddlebook.api.quantity.Unit;
import org.saddlebook.model.eyring.internal.Eyring;
import org.saddlebook.testkit.api.Example;
import org.saddlebook.testkit.api.RateModelContract;

class EyringHeatCapacityContractTest extends RateModelContract {
    private static final Unit PER_SECOND = new Unit("/s", Dimension.rateConstant(1), 1, 0);
    private static final Unit MOLAR_PER_SECOND = new Unit("L/(mol.s)", Dimension.rateConstant(2), 1e-3, 0);
    private static final Unit ZEROTH_ORDER = new Unit("mol/(L.s)", Dimension.rateConstant(0), 1e3, 0);

    @Override
    protected RateModel model() {
        return new EyringHeatCapacity();
    }

    @Override
    protected List<Example> examples() {
        return List.of(
                Example.of(RateContext.of(PER_SECOND, 1), 85_000, -20, -300),
                Example.of(RateContext.of(MOLAR_PER_SECOND, 2).withTransmission(0.4), 42_000, -90, 150),
                Example.of(
                                RateContext.of(MOLAR_PER_SECOND, 2)
                                        .withStandard(StandardState.ONE_BAR)
                                        .withReferenceKelvin(1000),
                                60_000,
                                -110,
                                25)
                        .between(300, 2000),
                Example.of(RateContext.of(PER_SECOND, 1).withFixed("dCp", -200), 85_000, -20));
    }

    @Override
    protected List<RateContext> inapplicable() {
        return List.of(RateContext.of(ZEROTH_ORDER, 0));
    }

    @Override
    protected Optional<RateModel> contained() {
        return Optional.of(new Eyring());
    }
}
