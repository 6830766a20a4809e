package hemline.casefile.edit;

import java.util.Comparator;

/** Orders ids as people do: letters first, then the number they carry, so that T9 comes before T10. */
final class TrackOrder implements Comparator<String> {
    static final TrackOrder BY_ID = new TrackOrder();

    private TrackOrder() {
    }

    @Override
    public int compare(String a, String b) {
        int headA = headLength(a);
        int headB = headLength(b);
        int heads = a.substring(0, headA).compareTo(b.substring(0, headB));
        if (heads != 0) {
            return heads;
        }
        String digitsA = significant(a.substring(headA));
        String digitsB = significant(b.substring(headB));
        if (digitsA.length() != digitsB.length()) {
            return Integer.compare(digitsA.length(), digitsB.length());
        }
        int numbers = digitsA.compareTo(digitsB);
        return numbers != 0 ? numbers : a.compareTo(b);
    }

    private static int headLength(String id) {
        int end = id.length();
        while (end > 0 && id.charAt(end - 1) >= '0' && id.charAt(end - 1) <= '9') {
            end--;
        }
        return end;
    }

    private static String significant(String digits) {
        int start = 0;
        while (start < digits.length() - 1 && digits.charAt(start) == '0') {
            start++;
        }
        return digits.substring(start);
    }
}
