// SPDX-License-Identifier: Apache-2.0
package reedling.cli;

import java.util.concurrent.CompletableFuture;
import org.jspecify.annotations.Nullable;
import reedling.run.StopFlag;

/**
 * Lets a run end well when a signal (Ctrl-C, SIGTERM) ends the program: the hook asks the run to stop, waits until the
 * command has returned and ends the program with the command's exit code instead of the signal's.
 *
 * <p>Threads: {@link #stopOnSignal} and {@link #reached} by the command's thread, the hook by the Java machine.
 */
class Ending {

    /** For commands inside another program, which signals do not concern. */
    static final Ending NONE = new Ending() {
        @Override
        void stopOnSignal(StopFlag stop) {}
    };

    private final CompletableFuture<Integer> code = new CompletableFuture<>();
    private @Nullable Thread hook;
    private volatile @Nullable StopFlag flag;
    private volatile boolean signalled;

    /** From now on a signal raises this flag, and no longer that of a run before. */
    void stopOnSignal(StopFlag stop) {
        flag = stop;
        if (signalled) {
            stop.raise(); // the signal came between two runs
        }
        if (hook == null) {
            hook = new Thread(this::endWell, "reedling-signal");
            Runtime.getRuntime().addShutdownHook(hook);
        }
    }

    /** Says that the command has returned and everything is written. */
    void reached(int exitCode) {
        code.complete(exitCode);
        if (hook != null && !hook.isAlive()) {
            takeBack(hook);
        }
    }

    private static void takeBack(Thread unused) {
        try {
            Runtime.getRuntime().removeShutdownHook(unused);
        } catch (IllegalStateException signalCameJustNow) {
            return; // the hook ends the program with the code it was given
        }
    }

    private void endWell() {
        signalled = true;
        StopFlag now = flag;
        if (now != null) {
            now.raise();
        }
        // A hook cannot return an exit code; the command's is the one a script asks for.
        Runtime.getRuntime().halt(code.join());
    }
}
