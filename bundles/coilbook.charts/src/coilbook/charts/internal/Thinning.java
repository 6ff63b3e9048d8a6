package coilbook.charts.internal;

/**
 * Fewer points for the same picture: of the samples that fall into one slot, the lowest and the highest are kept in their order. Every
 * n-th sample would lose the peak, which is what the chart is looked at for.
 */
final class Thinning {

    private final double[] x;
    private final double[] y;
    private final int size;

    private Thinning(double[] x, double[] y, int size) {
        this.x = x;
        this.y = y;
        this.size = size;
    }

    /** At most two points a slot, and the first and last sample. */
    static Thinning of(double[] x, double[] y, int slots) {
        int samples = Math.min(x.length, y.length);
        if (samples <= 2 * slots + 2) {
            return new Thinning(x, y, samples);
        }
        double[] keptX = new double[2 * slots + 2];
        double[] keptY = new double[2 * slots + 2];
        int kept = 0;
        keptX[kept] = x[0];
        keptY[kept++] = y[0];
        for (int slot = 0; slot < slots; slot++) {
            int from = 1 + (int) ((long) (samples - 2) * slot / slots);
            int to = 1 + (int) ((long) (samples - 2) * (slot + 1) / slots);
            int low = from;
            int high = from;
            for (int i = from; i < to; i++) {
                low = y[i] < y[low] ? i : low;
                high = y[i] > y[high] ? i : high;
            }
            keptX[kept] = x[Math.min(low, high)];
            keptY[kept++] = y[Math.min(low, high)];
            if (low != high) {
                keptX[kept] = x[Math.max(low, high)];
                keptY[kept++] = y[Math.max(low, high)];
            }
        }
        keptX[kept] = x[samples - 1];
        keptY[kept++] = y[samples - 1];
        return new Thinning(keptX, keptY, kept);
    }

    int size() {
        return size;
    }

    double x(int index) {
        return x[index];
    }

    double y(int index) {
        return y[index];
    }
}
