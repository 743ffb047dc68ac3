/** Steps of the evaluation: implement {@link org.saddlebook.api.analysis.Analysis} and register it as a service. */
@Export
@Version("1.0.0")
package org.saddlebook.api.analysis;

import org.osgi.annotation.bundle.Export;
import org.osgi.annotation.versioning.Version;
