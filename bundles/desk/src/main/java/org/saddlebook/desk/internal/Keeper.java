package org.saddlebook.desk.internal;

import java.io.IOException;
import java.util.LinkedHashMap;
import java.util.Map;
import java.util.Optional;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.concurrent.RejectedExecutionException;
import java.util.concurrent.TimeUnit;
import java.util.function.Consumer;
import javax.swing.SwingUtilities;
import org.saddlebook.api.problem.InputException;
import org.saddlebook.api.service.CampaignFolder;
import org.saddlebook.desk.api.DeskState;

/** Keeps unsaved work as soon as it changes, on a thread of its own, the newest state of each campaign only. */
final class Keeper {
    private final Optional<Recovery> recovery;
    private final Services services;
    private final Consumer<Throwable> failed;
    private final Map<String, DeskState> waiting = new LinkedHashMap<>(); // guarded by itself
    private final ExecutorService thread = Executors.newSingleThreadExecutor(work -> {
        Thread made = new Thread(work, "desk keeper");
        made.setDaemon(true);
        return made;
    });

    /**
     * A keeper.
     *
     * @param failed receives what went wrong, on the event thread
     */
    Keeper(Optional<Recovery> recovery, Services services, Consumer<Throwable> failed) {
        this.recovery = recovery;
        this.services = services;
        this.failed = failed;
    }

    /** Keeps the state a campaign has now. */
    void keep(OpenCampaign campaign) {
        synchronized (waiting) {
            waiting.put(campaign.key(), campaign.state());
        }
        submit(this::write);
    }

    /** Nothing of a campaign need be kept any more. */
    void drop(String key) {
        synchronized (waiting) {
            waiting.remove(key);
        }
        submit(() -> {
            if (recovery.isPresent()) {
                recovery.get().drop(key);
            }
        });
    }

    private interface Writing {
        void run() throws IOException, InputException;
    }

    private void submit(Writing writing) {
        try {
            thread.execute(() -> {
                try {
                    writing.run();
                } catch (IOException | InputException | RuntimeException e) {
                    SwingUtilities.invokeLater(() -> failed.accept(e));
                }
            });
        } catch (RejectedExecutionException e) {
            // The desk is closing; what was kept before stays.
        }
    }

    private void write() throws IOException, InputException {
        Map<String, DeskState> now;
        synchronized (waiting) {
            now = new LinkedHashMap<>(waiting);
            waiting.clear();
        }
        Optional<CampaignFolder> folder = services.find(CampaignFolder.class);
        if (recovery.isEmpty() || folder.isEmpty()) {
            return;
        }
        for (Map.Entry<String, DeskState> entry : now.entrySet()) {
            recovery.get().keep(entry.getKey(), entry.getValue(), folder.get());
        }
    }

    /** Writes what waits and ends; false when that took longer than the limit. */
    boolean close(long limitMilliseconds) {
        thread.shutdown();
        try {
            return thread.awaitTermination(limitMilliseconds, TimeUnit.MILLISECONDS);
        } catch (InterruptedException e) {
            Thread.currentThread().interrupt();
            return false;
        }
    }
}
