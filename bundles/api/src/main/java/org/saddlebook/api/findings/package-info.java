/**
 * What was computed, as a neutral tree. An analysis returns one {@link org.saddlebook.api.findings.Section} made of
 * {@link org.saddlebook.api.findings.Node}s; all sections together are
 * {@link org.saddlebook.api.findings.Findings}. Full precision, no formatting: wording is for the bundle
 * {@code presentation}.
 */
@Export
@Version("1.0.0")
package org.saddlebook.api.findings;

import org.osgi.annotation.bundle.Export;
import org.osgi.annotation.versioning.Version;
