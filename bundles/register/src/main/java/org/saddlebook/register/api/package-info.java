/**
 * The append-only register: records that are added and never changed, sealed into a Merkle tree (RFC 9162) so that nobody
 * can alter, drop or reorder one unseen. Start with {@link org.saddlebook.register.api.Registers}, the service that opens
 * a {@link org.saddlebook.register.api.Register}; implement {@link org.saddlebook.register.api.RegisterStoreFactory} to
 * keep registers somewhere else. {@link org.saddlebook.register.api.MerkleTree} makes and checks proofs without any store.
 */
@Export
@Version("1.0.0")
package org.saddlebook.register.api;

import org.osgi.annotation.bundle.Export;
import org.osgi.annotation.versioning.Version;
