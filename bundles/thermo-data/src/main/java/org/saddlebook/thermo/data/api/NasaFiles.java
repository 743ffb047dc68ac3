package org.saddlebook.thermo.data.api;

import java.util.List;
import org.saddlebook.api.problem.InputException;
import org.saddlebook.thermo.data.internal.Nasa7Reader;
import org.saddlebook.thermo.data.internal.Nasa9Reader;

/** Reads files of NASA coefficients in the fixed columns in which they are published. */
public final class NasaFiles {
    private NasaFiles() {}

    /**
     * Four lines of 80 columns for each species (S. Gordon and B. J. McBride, NASA SP-273, 1971): name 1–18, elements and
     * their numbers 25–44 and 74–78, phase 45, lower, upper and middle temperature 46–55, 56–65 and 66–73, then fourteen
     * coefficients of 15 columns, those of the upper range first; line numbers in column 80. A first line {@code THERMO}, a
     * line of three default temperatures, comments starting with {@code !} and a last line {@code END} may be there.
     *
     * @param text content of the file
     * @param file its name, for problems
     * @param reference the publication, for people
     * @throws InputException with every problem found: line, column, found, expected, remedy
     */
    public static List<SpeciesData> nasa7(String text, String file, String reference) throws InputException {
        return Nasa7Reader.read(text, file, reference);
    }

    /**
     * Records of 80 columns (B. J. McBride, M. J. Zehe, S. Gordon, NASA TP-2002-211556, appendix A): name 1–16; number of
     * ranges 1–2, elements 11–50, phase 51–52 (0 gas), ΔfH°(298.15 K) 66–80; then for each range its temperatures 1–22,
     * seven exponents and nine coefficients of 16 columns. Exponents must be −2 to 4. Species with no range have only an
     * enthalpy and are left out.
     *
     * @param text content of the file
     * @param file its name, for problems
     * @param reference the publication, for people
     * @throws InputException with every problem found: line, column, found, expected, remedy
     */
    public static List<SpeciesData> nasa9(String text, String file, String reference) throws InputException {
        return Nasa9Reader.read(text, file, reference);
    }
}
