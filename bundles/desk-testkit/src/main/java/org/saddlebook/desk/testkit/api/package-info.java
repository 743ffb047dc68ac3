/**
 * For tests of panels: {@link org.saddlebook.desk.testkit.api.TestDesk} is a desk without a window that does background
 * work at once and remembers what it was told; {@link org.saddlebook.desk.testkit.api.ExampleStates} are campaigns with
 * findings; {@link org.saddlebook.desk.testkit.api.Pictures} paints a panel for looking at.
 */
@Export
@Version("1.0.0")
package org.saddlebook.desk.testkit.api;

import org.osgi.annotation.bundle.Export;
import org.osgi.annotation.versioning.Version;
