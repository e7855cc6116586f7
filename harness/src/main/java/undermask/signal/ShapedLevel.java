package undermask.signal;

/** The level of an edge train in time with its edges as they are shaped. */
public final class ShapedLevel {
    private final EdgeTrain train;
    /** Level just before each edge, edges taken as instants. */
    private final double[] before;

    private final double reach;

    /** Prepares a train. */
    public ShapedLevel(EdgeTrain train) {
        this.train = train;
        this.before = new double[train.size()];
        double level = train.initialLevel();
        double longest = 0;
        for (int e = 0; e < before.length; e++) {
            before[e] = level;
            level += train.step(e) + train.slope(e) * train.lengthAfter(e);
            longest = Math.max(longest, train.shape(e).reach());
        }
        this.reach = longest;
    }

    /** The level at a time in s, V. */
    public double at(double time) {
        int count = before.length;
        if (count == 0) {
            return train.initialLevel();
        }
        double inside = time - Math.floor(time / train.period()) * train.period();
        // edges as instants, and for each edge in reach the difference that its shape makes
        int last = lastBefore(inside);
        double since = last < 0 ? inside + train.period() - train.time(count - 1) : inside - train.time(last);
        int from = last < 0 ? count - 1 : last;
        double level = before[from] + train.step(from) + train.slope(from) * since;
        for (int e = last; e > last - count; e--) {
            double apart = inside - timeOf(e);
            if (apart > reach) {
                break;
            }
            level += train.step(Math.floorMod(e, count))
                    * (train.shape(Math.floorMod(e, count)).response(apart) - 1);
        }
        for (int e = last + 1; e < last + 1 + count; e++) {
            double apart = inside - timeOf(e);
            if (apart < -reach) {
                break;
            }
            level += train.step(Math.floorMod(e, count))
                    * train.shape(Math.floorMod(e, count)).response(apart);
        }
        return level;
    }

    private double timeOf(int edge) {
        int count = before.length;
        return train.time(Math.floorMod(edge, count)) + Math.floorDiv(edge, count) * train.period();
    }

    private int lastBefore(double time) {
        int low = -1;
        int high = before.length;
        while (high - low > 1) {
            int middle = (low + high) >>> 1;
            if (train.time(middle) <= time) {
                low = middle;
            } else {
                high = middle;
            }
        }
        return low;
    }
}
