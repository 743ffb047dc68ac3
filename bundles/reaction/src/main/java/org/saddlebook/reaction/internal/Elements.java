package org.saddlebook.reaction.internal;

import java.util.Arrays;
import java.util.HashSet;
import java.util.Set;

/** The symbols of the 118 elements (IUPAC, 2016), and D and T for the heavy isotopes of hydrogen (IUPAC Red Book IR-3.3.2). */
final class Elements {
    private static final Set<String> SYMBOLS = new HashSet<>(Arrays.asList(
            ("H D T He Li Be B C N O F Ne Na Mg Al Si P S Cl Ar K Ca Sc Ti V Cr Mn Fe Co Ni Cu Zn Ga Ge As"
                            + " Se Br Kr Rb Sr Y Zr Nb Mo Tc Ru Rh Pd Ag Cd In Sn Sb Te I Xe Cs Ba La Ce Pr Nd Pm Sm Eu"
                            + " Gd Tb Dy Ho Er Tm Yb Lu Hf Ta W Re Os Ir Pt Au Hg Tl Pb Bi Po At Rn Fr Ra Ac Th Pa U Np"
                            + " Pu Am Cm Bk Cf Es Fm Md No Lr Rf Db Sg Bh Hs Mt Ds Rg Cn Nh Fl Mc Lv Ts Og")
                    .split(" ", -1)));

    /** Elements that form chains or diatomic ions, so that {@code X2+} may mean two atoms or two charges. */
    private static final Set<String> NON_METALS = Set.of(
            "H", "D", "T", "He", "B", "C", "N", "O", "F", "Ne", "Si", "P", "S", "Cl", "Ar", "As", "Se", "Br", "Kr",
            "Te", "I", "Xe", "At", "Rn");

    private Elements() {}

    static boolean known(String symbol) {
        return SYMBOLS.contains(symbol);
    }

    static boolean metal(String symbol) {
        return known(symbol) && !NON_METALS.contains(symbol);
    }
}
