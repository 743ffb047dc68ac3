/**
 * Registers in one SQLite file each. {@link org.saddlebook.register.sqlite.internal.SqliteStoreFactory} is the service;
 * nothing of SQLite is loaded before it opens a register.
 */
package org.saddlebook.register.sqlite.internal;
