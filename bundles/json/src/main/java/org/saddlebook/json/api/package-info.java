/**
 * JSON as files need it: read strictly and with positions, written so that the same tree always gives the same bytes on
 * every Java version. {@link org.saddlebook.json.api.JsonReader} reads, {@link org.saddlebook.json.api.JsonCursor} takes
 * a tree apart with messages for people, {@link org.saddlebook.json.api.PrettyJson} writes for people and
 * {@link org.saddlebook.json.api.CanonicalJson} for hashes (RFC 8785).
 */
@Export
@Version("1.0.0")
package org.saddlebook.json.api;

import org.osgi.annotation.bundle.Export;
import org.osgi.annotation.versioning.Version;
