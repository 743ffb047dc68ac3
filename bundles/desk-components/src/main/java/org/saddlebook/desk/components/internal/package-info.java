/** Components of the desk as services. */
package org.saddlebook.desk.components.internal;
