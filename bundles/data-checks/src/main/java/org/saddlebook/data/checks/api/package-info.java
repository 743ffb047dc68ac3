/**
 * Which mix-ups of units a rate constant can suffer, and by how much each shifts it: start with
 * {@link org.saddlebook.data.checks.api.MixUps#of} for the list and {@link org.saddlebook.data.checks.api.ShiftTest} for
 * the question whether a difference between two results is one of them.
 */
@Export
@Version("1.0.0")
package org.saddlebook.data.checks.api;

import org.osgi.annotation.bundle.Export;
import org.osgi.annotation.versioning.Version;
