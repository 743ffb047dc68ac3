/**
 * Units, dimensions and physical constants. Arithmetic is in SI; a {@link org.saddlebook.api.quantity.Unit} says how a
 * number read or shown relates to it. Start with {@code Unit}; the grammar of unit expressions is in the bundle
 * {@code units}.
 */
@Export
@Version("1.0.0")
package org.saddlebook.api.quantity;

import org.osgi.annotation.bundle.Export;
import org.osgi.annotation.versioning.Version;
