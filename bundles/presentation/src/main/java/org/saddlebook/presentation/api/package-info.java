/**
 * Numbers, units, problems and cautions put into words, the same for console, report and desk. Pure functions on the
 * types of {@code api}; they compute nothing and hold nothing.
 *
 * <p>Start with {@link org.saddlebook.presentation.api.QuantityText} for a measured or estimated quantity,
 * {@link org.saddlebook.presentation.api.Rounding} for bare numbers, {@link org.saddlebook.presentation.api.UnitText} for
 * units, {@link org.saddlebook.presentation.api.ProblemText} for bad input and
 * {@link org.saddlebook.presentation.api.CautionText} for the standard cautions.
 *
 * <p>Texts are for people: rounded, with a true minus sign and raised exponents. Files hold full precision instead.
 * Digits come from {@link java.math.BigDecimal}, so that every Java version prints the same.
 */
@Export
@Version("1.0.0")
package org.saddlebook.presentation.api;

import org.osgi.annotation.bundle.Export;
import org.osgi.annotation.versioning.Version;
