package org.saddlebook.console.internal;

import java.io.IOException;
import java.io.PrintStream;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.osgi.framework.Bundle;
import org.osgi.framework.BundleContext;
import org.saddlebook.console.api.ExitCode;
import org.saddlebook.json.api.JsonArray;
import org.saddlebook.json.api.JsonObject;
import org.saddlebook.json.api.JsonValue;
import org.saddlebook.json.api.PrettyJson;

/** {@code bundles list}. */
final class BundleListing {
    private final Services services;
    private final InstalledBundles installed;

    BundleListing(BundleContext context, InstalledBundles installed) {
        this.services = new Services(context);
        this.installed = installed;
    }

    int print(PrintStream out, boolean json) throws IOException {
        if (json) {
            out.write(PrettyJson.bytes(tree()));
        } else {
            printText(out);
        }
        return ExitCode.DONE;
    }

    private void printText(PrintStream out) throws IOException {
        out.println("Features: "
                + services.setting("saddlebook.features", "unknown").replace(",", ", "));
        String off = services.setting("saddlebook.features.off", "");
        if (!off.isEmpty()) {
            out.println("Switched off by the policy of this machine: " + off.replace(",", ", "));
        }
        NotInstalled.notice(services).ifPresent(out::println);
        out.println();
        int width = 0;
        for (Bundle bundle : installed.all()) {
            width = Math.max(width, String.valueOf(bundle.getSymbolicName()).length());
        }
        for (Bundle bundle : installed.all()) {
            out.println(Lines.padded(String.valueOf(bundle.getSymbolicName()), width + 2)
                    + Lines.padded(bundle.getVersion().toString(), 12)
                    + Lines.padded(installed.ofProduct(bundle) ? "product" : "added", 9)
                    + Lines.padded(InstalledBundles.state(bundle), 14)
                    + hash(bundle));
        }
        Map<String, String> troubles = installed.troubles();
        if (!troubles.isEmpty()) {
            out.println();
            out.println("Not right:");
            troubles.values().forEach(sentence -> Lines.wrapped(out, "  - ", sentence));
        }
    }

    private JsonObject tree() throws IOException {
        List<JsonValue> bundles = new ArrayList<>();
        Map<String, String> troubles = installed.troubles();
        for (Bundle bundle : installed.all()) {
            JsonObject.Builder builder = JsonObject.builder()
                    .put("name", String.valueOf(bundle.getSymbolicName()))
                    .put("version", bundle.getVersion().toString())
                    .put("origin", installed.ofProduct(bundle) ? "product" : "added")
                    .put("state", InstalledBundles.state(bundle))
                    .put("sha256", hash(bundle));
            String trouble = troubles.remove(String.valueOf(bundle.getSymbolicName()));
            if (trouble != null) {
                builder.put("problem", trouble);
            }
            bundles.add(builder.build());
        }
        return JsonObject.builder()
                .put("schema", "saddlebook/bundles/1")
                .put("features", texts(services.setting("saddlebook.features", "")))
                .put("featuresOff", texts(services.setting("saddlebook.features.off", "")))
                .put("bundles", new JsonArray(bundles))
                .put("problems", JsonArray.ofStrings(List.copyOf(troubles.values())))
                .build();
    }

    private static JsonArray texts(String list) {
        return JsonArray.ofStrings(list.isEmpty() ? List.of() : List.of(list.split(",", -1)));
    }

    private static String hash(Bundle bundle) throws IOException {
        Optional<Path> file = BundleFile.pathOf(bundle);
        return file.isEmpty() ? "" : BundleFile.sha256(file.get());
    }
}
