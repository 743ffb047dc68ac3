/**
 * Laws for the temperature dependence of a rate constant. Implement {@link org.saddlebook.api.model.RateModel} and
 * register it as a service; nothing else is needed. The bundle {@code model-eyring} is a complete example, and the
 * contract test in {@code testkit} checks gradients and behaviour. A law that depends on more than the temperature takes
 * {@link org.saddlebook.api.model.Conditions}; tunnelling corrections implement {@link
 * org.saddlebook.api.model.TunnellingModel}.
 */
@Export
@Version("1.0.0")
package org.saddlebook.api.model;

import org.osgi.annotation.bundle.Export;
import org.osgi.annotation.versioning.Version;
