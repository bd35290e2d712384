package binspan.planner.view;

import java.lang.management.ManagementFactory;
import java.lang.management.ThreadMXBean;

/**
 * Processor time in ms.
 *
 * @param window of the window's thread
 * @param program of all threads of the program
 */
record ProcessorTime(double window, double program) {
    private static final double MILLI = 1e-6;
    private static final ThreadMXBean THREADS = ManagementFactory.getThreadMXBean();

    /** Used up to now. */
    static ProcessorTime now() {
        long window = Shown.onWindowThread(THREADS::getCurrentThreadCpuTime);
        long program = ManagementFactory.getPlatformMXBean(com.sun.management.OperatingSystemMXBean.class)
                .getProcessCpuTime();
        return new ProcessorTime(window * MILLI, program * MILLI);
    }

    /** Used since an earlier moment. */
    ProcessorTime since(ProcessorTime earlier) {
        return new ProcessorTime(window - earlier.window, program - earlier.program);
    }
}
