/**
 * Panels of the desk. A capability that wants a stratum in the window registers a
 * {@link org.saddlebook.desk.api.DeskPanelProvider} as an OSGi service; the desk asks it for a
 * {@link org.saddlebook.desk.api.DeskPanel} for the campaign in view, hands it immutable
 * {@link org.saddlebook.desk.api.DeskState}s, and gives it everything else through
 * {@link org.saddlebook.desk.api.DeskContext}: the temperature scale, the hairline, changes that can be undone, background
 * work, questions. Panels come and go while the desk runs; one that breaks shows its failure in its own place.
 *
 * <p>Everything is called on the event thread unless it says otherwise. Nothing here computes: what is shown comes from
 * findings and services.
 */
@Export
@Version("1.0.0")
package org.saddlebook.desk.api;

import org.osgi.annotation.bundle.Export;
import org.osgi.annotation.versioning.Version;
