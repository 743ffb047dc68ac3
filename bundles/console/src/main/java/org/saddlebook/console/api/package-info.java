/** Commands of the console: implement {@link org.saddlebook.console.api.Verb} and register it as a service. */
@Export
@Version("1.0.0")
package org.saddlebook.console.api;

import org.osgi.annotation.bundle.Export;
import org.osgi.annotation.versioning.Version;
