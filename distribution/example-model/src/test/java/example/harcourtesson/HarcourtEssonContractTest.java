package example.harcourtesson;

import java.util.List;
import org.saddlebook.api.model.RateContext;
import org.saddlebook.api.model.RateModel;
import org.saddlebook.api.model.StandardState;
import org.saddlebook.api.quantity.Dimension;
import org.saddlebook.api.quantity.Unit;
import org.saddlebook.testkit.api.Example;
import org.saddlebook.testkit.api.RateModelContract;

class HarcourtEssonContractTest extends RateModelContract {
    private static final Unit PER_SECOND = new Unit("/s", Dimension.rateConstant(1), 1, 0);
    private static final Unit MOLAR_PER_SECOND = new Unit("L/(mol.s)", Dimension.rateConstant(2), 1e-3, 0);

    @Override
    protected RateModel model() {
        return new HarcourtEsson();
    }

    @Override
    protected List<Example> examples() {
        return List.of(
                Example.of(RateContext.of(PER_SECOND, 1), StrictMath.log(1e-4), 33),
                Example.of(RateContext.of(MOLAR_PER_SECOND, 2).withStandard(StandardState.ONE_BAR), -9, 21),
                Example.of(RateContext.of(new Unit("mol/(L.s)", Dimension.rateConstant(0), 1e3, 0), 0), -2, 25));
    }
}
