/** Bad input as data: a {@link org.saddlebook.api.problem.Problem} names place, found, expected and remedy. */
@Export
@Version("1.0.0")
package org.saddlebook.api.problem;

import org.osgi.annotation.bundle.Export;
import org.osgi.annotation.versioning.Version;
