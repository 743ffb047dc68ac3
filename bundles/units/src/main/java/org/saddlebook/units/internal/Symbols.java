package org.saddlebook.units.internal;

import java.math.BigDecimal;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import org.saddlebook.api.quantity.Dimension;

/**
 * The table of units. Symbols and values are those of the Unified Code for Units of Measure (UCUM 2.2) and of the SI
 * Brochure, 9th edition, 2019 (tables 4, 5, 7 and 8); the calories are those of ISO 80000-5 annex C as UCUM has them,
 * the hartree is CODATA 2022. {@code Torr}, {@code [Eh]} and fractional exponents are not UCUM: it has none.
 */
final class Symbols {
    /** Ranks: the order in which factors stand in a normalised term. */
    private static final int SCALE = 0;

    private static final int CONSTANT = 1;
    private static final int ENERGY = 2;
    private static final int PRESSURE = 3;
    private static final int MASS = 4;
    private static final int LENGTH = 5;
    private static final int AMOUNT = 6;
    private static final int KELVIN = 7;
    private static final int TIME = 8;

    private static final Dimension MASS_DIMENSION = new Dimension(1, 0, 0, 0, 0);
    private static final Dimension LENGTH_DIMENSION = new Dimension(0, 1, 0, 0, 0);
    private static final Dimension VOLUME = new Dimension(0, 3, 0, 0, 0);
    private static final Dimension TIME_DIMENSION = new Dimension(0, 0, 1, 0, 0);
    private static final Dimension FREQUENCY = new Dimension(0, 0, -1, 0, 0);
    private static final Dimension AMOUNT_DIMENSION = new Dimension(0, 0, 0, 0, 1);
    private static final Dimension ENERGY_DIMENSION = new Dimension(1, 2, -2, 0, 0);

    private static final String AVOGADRO = "6.02214076E23";

    static final Symbol TEN = new Symbol("10*", SCALE, BigDecimal.TEN, BigDecimal.ONE, BigDecimal.ZERO, Dimension.NONE);

    /** In the order of the public list. */
    static final List<Entry> TABLE = new ArrayList<>();

    private static final Map<String, Entry> BY_SPELLING = new HashMap<>();

    private static final String[] PREFIXES = {
        "Y", "Z", "E", "P", "T", "G", "M", "k", "h", "da", "d", "c", "m", "u", "n", "p", "f", "a", "z", "y"
    };
    private static final int[] POWERS = {24, 21, 18, 15, 12, 9, 6, 3, 2, 1, -1, -2, -3, -6, -9, -12, -15, -18, -21, -24
    };

    static final Symbol LITRE;
    static final Symbol MOLECULE;
    static final Symbol PLANCK;
    static final Symbol LIGHT;
    static final Symbol BOLTZMANN;

    static {
        metric("s", TIME, "1", TIME_DIMENSION, "second", "sec", "second", "seconds");
        plain("min", TIME, "60", TIME_DIMENSION, "minute", "mins", "minute", "minutes");
        plain("h", TIME, "3600", TIME_DIMENSION, "hour", "hr", "hrs", "hour", "hours");
        plain("d", TIME, "86400", TIME_DIMENSION, "day", "day", "days");
        plain("wk", TIME, "604800", TIME_DIMENSION, "week", "week", "weeks");
        plain("a", TIME, "31557600", TIME_DIMENSION, "year of 365.25 days", "yr", "year", "years");
        metric("Hz", TIME, "1", FREQUENCY, "hertz");
        metric("m", LENGTH, "1", LENGTH_DIMENSION, "metre", "metre", "meter");
        LITRE = metric("L", LENGTH, "0.001", VOLUME, "litre", "l", "litre", "litres", "liter", "liters");
        metric("mol", AMOUNT, "1", AMOUNT_DIMENSION, "mole", "mole", "moles");
        MOLECULE = add(
                "{molecule}",
                AMOUNT,
                "1",
                AVOGADRO,
                "0",
                AMOUNT_DIMENSION,
                "molecule: 1/N_A of a mole",
                false,
                "molecule",
                "molecules",
                "molec",
                "particle",
                "particles",
                "{molecules}",
                "{molec}",
                "{particle}",
                "{particles}");
        metric("K", KELVIN, "1", Dimension.TEMPERATURE, "kelvin", "kelvin");
        add("Cel", KELVIN, "1", "1", "273.15", Dimension.TEMPERATURE, "degree Celsius", false, "degC", "°C");
        add("[degF]", KELVIN, "5", "9", "2298.35", Dimension.TEMPERATURE, "degree Fahrenheit", false, "degF", "°F");
        metric("J", ENERGY, "1", ENERGY_DIMENSION, "joule");
        metric("cal", ENERGY, "4.184", ENERGY_DIMENSION, "calorie (thermochemical)");
        metric("cal_th", ENERGY, "4.184", ENERGY_DIMENSION, "thermochemical calorie");
        metric("cal_IT", ENERGY, "4.1868", ENERGY_DIMENSION, "International Table calorie");
        metric("eV", ENERGY, "1.602176634E-19", ENERGY_DIMENSION, "electronvolt");
        plain("[Eh]", ENERGY, "4.3597447222060E-18", ENERGY_DIMENSION, "hartree", "hartree", "Eh");
        metric("erg", ENERGY, "1E-7", ENERGY_DIMENSION, "erg");
        metric("Pa", PRESSURE, "1", Dimension.PRESSURE, "pascal");
        metric("bar", PRESSURE, "100000", Dimension.PRESSURE, "bar");
        plain("atm", PRESSURE, "101325", Dimension.PRESSURE, "standard atmosphere");
        add("Torr", PRESSURE, "101325", "760", "0", Dimension.PRESSURE, "torr", true, "torr");
        metric("g", MASS, "0.001", MASS_DIMENSION, "gram");
        plain("%", SCALE, "0.01", Dimension.NONE, "percent");
        BOLTZMANN = plain("[k]", CONSTANT, "1.380649E-23", new Dimension(1, 2, -2, -1, 0), "Boltzmann constant");
        PLANCK = plain("[h]", CONSTANT, "6.62607015E-34", new Dimension(1, 2, -1, 0, 0), "Planck constant");
        LIGHT = plain("[c]", CONSTANT, "299792458", new Dimension(0, 1, -1, 0, 0), "speed of light");
    }

    private Symbols() {}

    /** The symbol of a spelling, or null when there is none; {@code M} is not a symbol but a product. */
    static Symbol find(String spelling) {
        Entry exact = BY_SPELLING.get(spelling);
        if (exact != null) {
            return exact.symbol();
        }
        for (int i = 0; i < PREFIXES.length; i++) {
            String prefix = PREFIXES[i];
            if (spelling.length() > prefix.length() && spelling.startsWith(prefix)) {
                Entry entry = BY_SPELLING.get(spelling.substring(prefix.length()));
                // Words take no prefix here: "millimole" is not a spelling of the trade's tables.
                if (entry != null && entry.prefixes() && isSymbol(entry, spelling.substring(prefix.length()))) {
                    return entry.symbol().prefixed(prefix, POWERS[i]);
                }
            }
        }
        return null;
    }

    /** The power of ten of a prefix, or {@code Integer.MIN_VALUE}. */
    static boolean isPrefix(String text) {
        for (String prefix : PREFIXES) {
            if (prefix.equals(text)) {
                return true;
            }
        }
        return false;
    }

    private static boolean isSymbol(Entry entry, String spelling) {
        return spelling.equals(entry.symbol().code()) || spelling.equals("l");
    }

    private static Symbol metric(
            String code, int rank, String factor, Dimension dimension, String name, String... spellings) {
        return add(code, rank, factor, "1", "0", dimension, name, true, spellings);
    }

    private static Symbol plain(
            String code, int rank, String factor, Dimension dimension, String name, String... spellings) {
        return add(code, rank, factor, "1", "0", dimension, name, false, spellings);
    }

    private static Symbol add(
            String code,
            int rank,
            String numerator,
            String denominator,
            String offset,
            Dimension dimension,
            String name,
            boolean prefixes,
            String... spellings) {
        Symbol symbol = new Symbol(
                code, rank, new BigDecimal(numerator), new BigDecimal(denominator), new BigDecimal(offset), dimension);
        Entry entry = new Entry(symbol, name, prefixes, List.of(spellings));
        TABLE.add(entry);
        BY_SPELLING.put(code, entry);
        for (String spelling : spellings) {
            BY_SPELLING.put(spelling, entry);
        }
        return symbol;
    }
}
