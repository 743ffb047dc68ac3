package org.saddlebook.thermo.data.api;

import java.util.List;
import java.util.Map;
import org.saddlebook.api.problem.InputException;
import org.saddlebook.thermo.data.internal.FileSource;
import org.saddlebook.thermo.data.internal.SpeciesFileReader;

/** Reads a laboratory's own files of species data, and makes a source of them. */
public final class SpeciesFiles {
    private SpeciesFiles() {}

    /**
     * Reads one file; what it is shows from its content:
     *
     * <ul>
     *   <li>NASA 7 coefficients, see {@link NasaFiles#nasa7};
     *   <li>NASA 9 coefficients, see {@link NasaFiles#nasa9};
     *   <li>Shomate coefficients: a header {@code species;lower_K;upper_K;A;B;C;D;E;F;G} and a line for each range;
     *   <li>a table of one species: a header {@code temperature_K;Cp_J_mol-1_K-1;S_J_mol-1_K-1;H_minus_H298_kJ_mol-1;dfH_kJ_mol-1}
     *       (more columns may follow), with a row at 298.15 K, and the species in a comment line {@code # species: NO2(g)} or in the
     *       name of the file, {@code NO2_g.csv}.
     * </ul>
     *
     * In the last two commas may stand for the semicolons, and lines starting with {@code #} are comments.
     *
     * @param text content of the file
     * @param file its name
     * @param reference its publication, for people
     * @throws InputException with every problem found: line, column, found, expected, remedy
     */
    public static List<SpeciesData> read(String text, String file, String reference) throws InputException {
        return SpeciesFileReader.read(text, file, reference);
    }

    /**
     * A source of such files, to be registered as a service.
     *
     * @param id of the source, lower case with hyphens
     * @param title for people
     * @param files name to content; read when a species is first asked for
     */
    public static SpeciesSource source(String id, String title, Map<String, String> files) {
        return new FileSource(id, title, files);
    }
}
