/**
 * How a bundle gives its section of findings a place of its own in the report: it registers a
 * {@link org.saddlebook.report.api.ReportPart}. A section without one is shown by a default part that knows every kind of
 * node, so a part is a matter of comfort and never needed.
 */
@Export
@Version("1.0.0")
package org.saddlebook.report.api;

import org.osgi.annotation.bundle.Export;
import org.osgi.annotation.versioning.Version;
