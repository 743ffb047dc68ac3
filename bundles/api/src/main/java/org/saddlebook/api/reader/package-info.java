/** Reading files at import: implement {@link org.saddlebook.api.reader.DataReader} and register it as a service. */
@Export
@Version("1.0.0")
package org.saddlebook.api.reader;

import org.osgi.annotation.bundle.Export;
import org.osgi.annotation.versioning.Version;
