/**
 * What panels of the desk are made of: figures that answer to mouse and keyboard, tables that go on into spreadsheets,
 * trees of findings, pages that run downward, strips of marks on the temperature rail. Panels get the components with
 * services inside from {@link org.saddlebook.desk.components.api.DeskComponents}; the others are made with {@code new}.
 * Everything has an accessible name and lives on the event thread. Nothing here computes.
 */
@Export
@Version("1.0.0")
package org.saddlebook.desk.components.api;

import org.osgi.annotation.bundle.Export;
import org.osgi.annotation.versioning.Version;
