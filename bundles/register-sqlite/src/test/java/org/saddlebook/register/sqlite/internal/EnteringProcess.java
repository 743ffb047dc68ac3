package org.saddlebook.register.sqlite.internal;

import java.io.IOException;
import java.nio.file.Path;
import java.util.List;
import java.util.Random;
import org.saddlebook.register.api.Draft;
import org.saddlebook.register.api.PartFile;
import org.saddlebook.register.api.Receipt;
import org.saddlebook.register.api.Register;
import org.saddlebook.register.api.RegisterStoreFactory.Opening;

/**
 * A process that enters: says {@code ready}, waits for a byte on standard input, enters, and says {@code ack NUMBER ROOT}
 * after each record that the register has acknowledged.
 */
final class EnteringProcess {
    private EnteringProcess() {}

    public static void main(String[] arguments) throws Exception {
        Path file = Path.of(arguments[0]);
        Random random = new Random(Long.parseLong(arguments[1]));
        int count = Integer.parseInt(arguments[2]);
        say("ready");
        if (System.in.read() < 0) {
            return;
        }
        endWithTheTest();
        try (Register register = Fixture.open(file, Opening.CREATE)) {
            for (int i = 0; i < count; i++) {
                byte[] campaign = new byte[random.nextInt(2_000)];
                random.nextBytes(campaign);
                // Now and then a part of several megabytes, so that some deaths fall into a long transaction.
                byte[] source = new byte[random.nextInt(20) == 0 ? 6_000_000 : random.nextInt(60_000)];
                random.nextBytes(source);
                Receipt receipt = register.enter(
                        Draft.entered("process " + arguments[1], "entry " + i),
                        List.of(
                                PartFile.of("campaign.json", "application/json", campaign),
                                PartFile.of("sources/rates.csv", "text/csv", source)));
                say("ack " + receipt.number() + " " + receipt.head().root());
            }
        }
    }

    /** Standard input ends when the test's own process does: nobody is left entering. */
    private static void endWithTheTest() {
        Thread watch = new Thread(() -> {
            try {
                while (System.in.read() >= 0) {
                    // nothing more is said to this process
                }
            } catch (IOException e) {
                // the pipe broke, which says the same
            }
            Runtime.getRuntime().halt(1);
        });
        watch.setDaemon(true);
        watch.start();
    }

    private static void say(String line) {
        System.out.println(line);
        System.out.flush();
    }
}
