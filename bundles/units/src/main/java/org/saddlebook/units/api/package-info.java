/**
 * Unit expressions and quantities in and out: text that people write becomes a {@link
 * org.saddlebook.api.quantity.Unit}, a temperature, a standard state or a measured value, and what cannot be read with
 * certainty becomes a {@link org.saddlebook.units.api.UnitException} that says what was found, what is expected and what
 * to do. Nothing is guessed. Start with {@link org.saddlebook.units.api.Units}.
 */
@Export
@Version("1.0.0")
package org.saddlebook.units.api;

import org.osgi.annotation.bundle.Export;
import org.osgi.annotation.versioning.Version;
