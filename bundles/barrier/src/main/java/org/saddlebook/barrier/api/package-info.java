/**
 * The section {@code barrier} as typed values, for analyses that build on fitted laws: start with
 * {@link org.saddlebook.barrier.api.FittedLaws#of}.
 */
@Export
@Version("1.0.0")
package org.saddlebook.barrier.api;

import org.osgi.annotation.bundle.Export;
import org.osgi.annotation.versioning.Version;
