/** Services that console and desk call; they compute nothing themselves. */
@Export
@Version("1.0.0")
package org.saddlebook.api.service;

import org.osgi.annotation.bundle.Export;
import org.osgi.annotation.versioning.Version;
