/**
 * Least squares a reviewer can trust: estimates, covariances, quantiles and confidence sets, to known digits and the
 * same bits on every machine. Knows nothing of chemistry and of no other bundle.
 */
@Export
@Version("1.0.0")
package org.saddlebook.estimation.api;

import org.osgi.annotation.bundle.Export;
import org.osgi.annotation.versioning.Version;
