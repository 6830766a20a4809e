package hemline.scoring;

import java.util.Arrays;

/** The nearest element of each owner around a place; reused from place to place. Ties go to the earlier element. */
final class OwnerHits {
    private int size;
    private int[] owner = new int[8];
    private int[] element = new int[8];
    private double[] distanceKm = new double[8];
    private boolean anyHidden;

    void clear() {
        size = 0;
        anyHidden = false;
    }

    /** Hidden elements are only remembered to be there; plain ones are ranked. */
    void offer(int ofOwner, int e, double km, boolean plain) {
        if (!plain) {
            anyHidden = true;
            return;
        }
        int i = 0;
        while (i < size && owner[i] != ofOwner) {
            i++;
        }
        if (i == size) {
            if (size == owner.length) {
                owner = Arrays.copyOf(owner, 2 * size);
                element = Arrays.copyOf(element, 2 * size);
                distanceKm = Arrays.copyOf(distanceKm, 2 * size);
            }
            size++;
            owner[i] = ofOwner;
            distanceKm[i] = Double.POSITIVE_INFINITY;
        }
        if (km < distanceKm[i] || km == distanceKm[i] && e < element[i]) {
            element[i] = e;
            distanceKm[i] = km;
        }
    }

    boolean anyHidden() {
        return anyHidden;
    }

    /** The nearest plain element of the owner preferred if it has one here, else of any; −1 for none. */
    int choose(int preferred) {
        int best = -1;
        for (int i = 0; i < size; i++) {
            if (owner[i] == preferred) {
                return element[i];
            }
            if (best < 0 || distanceKm[i] < distanceKm[best]
                    || distanceKm[i] == distanceKm[best] && element[i] < element[best]) {
                best = i;
            }
        }
        return best < 0 ? -1 : element[best];
    }
}
