/**
 * Contract tests for authors of rate models and readers. Extend {@link org.saddlebook.testkit.api.RateModelContract} or
 * {@link org.saddlebook.testkit.api.DataReaderContract} in a JUnit 5 test, hand in the model or reader and a few examples,
 * and the inherited tests check everything the engine relies on. {@link org.saddlebook.testkit.api.BundleBuilder} turns
 * one source file into an installable bundle, and {@link org.saddlebook.testkit.api.BrokenModel} holds models that break
 * the contract on purpose, to test what stands around them. {@link org.saddlebook.testkit.api.NeedsScreen} marks tests that
 * open real windows.
 */
@Export
@Version("1.0.0")
package org.saddlebook.testkit.api;

import org.osgi.annotation.bundle.Export;
import org.osgi.annotation.versioning.Version;
