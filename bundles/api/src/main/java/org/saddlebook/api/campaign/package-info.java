/**
 * What was measured and decided: {@link org.saddlebook.api.campaign.Campaign}, an immutable document with its rate
 * table, choices, settings of add-ons and history. Values are in SI.
 */
@Export
@Version("1.0.0")
package org.saddlebook.api.campaign;

import org.osgi.annotation.bundle.Export;
import org.osgi.annotation.versioning.Version;
