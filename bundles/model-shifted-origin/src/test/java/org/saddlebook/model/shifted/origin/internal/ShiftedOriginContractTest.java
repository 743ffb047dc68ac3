package org.saddlebook.model.shifted.origin.internal;

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

class ShiftedOriginContractTest extends RateModelContract {
    private static final Unit PER_SECOND = new Unit("/s", Dimension.rateConstant(1), 1, 0);
    private static final Unit MOLAR_PER_SECOND = new Unit("L/(mol.s)", Dimension.rateConstant(2), 1e-3, 0);
    private static final Unit ZEROTH_ORDER = new Unit("mol/(L.s)", Dimension.rateConstant(0), 1e3, 0);

    @Override
    protected RateModel model() {
        return new ShiftedOrigin();
    }

    @Override
    protected List<Example> examples() {
        return List.of(
                Example.of(RateContext.of(PER_SECOND, 1), 18, 1800, 180),
                Example.of(RateContext.of(MOLAR_PER_SECOND, 2).withTransmission(0.4), 9, 1300, -60),
                Example.of(
                                RateContext.of(MOLAR_PER_SECOND, 2)
                                        .withStandard(StandardState.ONE_BAR)
                                        .withReferenceKelvin(400),
                                12,
                                2400,
                                320)
                        .between(400, 900),
                Example.of(RateContext.of(ZEROTH_ORDER, 0), 12, 2400, 100),
                Example.of(RateContext.of(PER_SECOND, 1).withFixed("Tinf", 150), 18, 1800));
    }

    @Override
    protected Optional<RateModel> contained() {
        return Optional.of(new Arrhenius());
    }
}
