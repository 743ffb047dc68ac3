package org.saddlebook.launcher.internal;

import java.util.Collection;
import java.util.HashSet;
import java.util.Set;
import org.osgi.framework.Bundle;
import org.osgi.framework.hooks.resolver.ResolverHook;
import org.osgi.framework.wiring.BundleCapability;
import org.osgi.framework.wiring.BundleRequirement;
import org.osgi.framework.wiring.BundleRevision;

/** Lets bundles of the product see only each other: an added bundle cannot slip its own copy of our packages under them. */
final class ProductFirst implements ResolverHook {
    private final Set<Bundle> product;

    ProductFirst(Collection<Bundle> product) {
        this.product = new HashSet<>(product);
    }

    @Override
    public void filterMatches(BundleRequirement requirement, Collection<BundleCapability> candidates) {
        if (product.contains(requirement.getRevision().getBundle())) {
            candidates.removeIf(candidate -> {
                Bundle provider = candidate.getRevision().getBundle();
                return provider.getBundleId() != 0 && !product.contains(provider);
            });
        }
    }

    @Override
    public void filterResolvable(Collection<BundleRevision> candidates) {}

    @Override
    public void filterSingletonCollisions(BundleCapability singleton, Collection<BundleCapability> candidates) {}

    @Override
    public void end() {}
}
