/** Long work: {@link org.saddlebook.api.task.Task} gives progress, cancel, named random streams and parallel parts. */
@Export
@Version("1.0.0")
package org.saddlebook.api.task;

import org.osgi.annotation.bundle.Export;
import org.osgi.annotation.versioning.Version;
