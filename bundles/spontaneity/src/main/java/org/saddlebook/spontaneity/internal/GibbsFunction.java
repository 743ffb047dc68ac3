package org.saddlebook.spontaneity.internal;

/** What the composition at equilibrium needs of a reaction. */
interface GibbsFunction {
    /** ΔG, J/mol. */
    double gibbs(double kelvin);

    /** ΔH, J/mol. */
    double enthalpy(double kelvin);

    /** Standard uncertainty of ΔG, J/mol; 0 where nothing is uncertain. */
    double uncertaintyOfGibbs(double kelvin);

    /** ΔH and ΔS that do not vary with temperature. */
    static GibbsFunction of(Stated stated) {
        return new GibbsFunction() {
            @Override
            public double gibbs(double kelvin) {
                return stated.gibbs(kelvin);
            }

            @Override
            public double enthalpy(double kelvin) {
                return stated.enthalpy();
            }

            @Override
            public double uncertaintyOfGibbs(double kelvin) {
                return Math.sqrt(stated.varianceOfGibbs(kelvin));
            }
        };
    }
}
