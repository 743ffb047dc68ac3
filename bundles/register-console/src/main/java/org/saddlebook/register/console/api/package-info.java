/**
 * What the verbs of the register and the desk share: which register is meant, what an entry consists of, evaluating an
 * entry again. Start with {@link org.saddlebook.register.console.api.EntryWork}, a service.
 */
@Export
@Version("1.0.0")
package org.saddlebook.register.console.api;

import org.osgi.annotation.bundle.Export;
import org.osgi.annotation.versioning.Version;
