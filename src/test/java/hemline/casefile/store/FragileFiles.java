package hemline.casefile.store;

import java.io.Closeable;
import java.io.IOException;
import java.nio.file.NoSuchFileException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Random;
import java.util.TreeMap;
import java.util.TreeSet;

/**
 * A file system in memory that stops at a chosen step, and then shows what a disk may hold after the power came back.
 *
 * <p>As pessimistic as POSIX allows (Pillai et al. 2014, OSDI '14): bytes not yet forced may be there, missing, cut
 * short or zeros; names made, renamed or deleted in a folder not yet forced may be as before or as after, in order.
 */
final class FragileFiles implements CaseFiles {
    /** The program ends here, whatever it is doing. */
    static final class Crash extends Error {
        private static final long serialVersionUID = 1L;

        Crash() {
            super("crash", null, false, false);
        }
    }

    private static final class Node {
        byte[] live = {};
        byte[] durable = {};

        void force() {
            durable = live;
        }

        Node survivor(Random random) {
            Node after = new Node();
            after.live = surviving(random);
            after.durable = after.live;
            return after;
        }

        private byte[] surviving(Random random) {
            if (Arrays.equals(live, durable)) {
                return live;
            }
            boolean cut = live.length > 0 && live.length < durable.length
                    && Arrays.equals(live, Arrays.copyOf(durable, live.length));
            if (cut) {
                return random.nextBoolean() ? live : durable;
            }
            boolean grown = live.length >= durable.length
                    && Arrays.equals(durable, Arrays.copyOf(live, durable.length));
            int sound = grown ? durable.length : 0;
            return switch (random.nextInt(4)) {
                case 0 -> durable;
                case 1 -> live;
                case 2 -> Arrays.copyOf(live, sound + random.nextInt(live.length - sound + 1));
                default -> Arrays.copyOf(Arrays.copyOf(live, sound), live.length);
            };
        }
    }

    private record NameChange(Path folder, Path gone, Path made, Node node) {
        void on(Map<Path, Node> names) {
            if (gone != null) {
                names.remove(gone);
            }
            if (made != null) {
                names.put(made, node);
            }
        }
    }

    private final Random random;
    private final Map<Path, Node> names = new TreeMap<>();
    private final Map<Path, Node> durableNames = new TreeMap<>();
    private final List<NameChange> pending = new ArrayList<>();
    private final TreeSet<Path> held = new TreeSet<>();
    private int stepsLeft = Integer.MAX_VALUE;
    private int steps;
    private boolean errorsInsteadOfCrash;

    FragileFiles(long seed) {
        random = new Random(seed);
    }

    /** Stops at the step after {@code count} more. */
    FragileFiles crashAfter(int count) {
        stepsLeft = count;
        return this;
    }

    /** Fails the step after {@code count} more with an error, as a full disk does, and works again after that. */
    FragileFiles failAfter(int count) {
        errorsInsteadOfCrash = true;
        return crashAfter(count);
    }

    int steps() {
        return steps;
    }

    /** What a new start of the program finds when only the program was killed. */
    FragileFiles afterKill() {
        FragileFiles after = new FragileFiles(random.nextLong());
        names.forEach((path, node) -> after.names.put(path, node));
        after.durableNames.putAll(durableNames);
        after.pending.addAll(pending);
        return after;
    }

    /** What a new start of the machine finds when the power failed. */
    FragileFiles afterPowerLoss() {
        FragileFiles after = new FragileFiles(random.nextLong());
        Map<Path, Node> left = new TreeMap<>(durableNames);
        Map<Path, Boolean> stopped = new TreeMap<>();
        for (NameChange change : pending) {
            if (!stopped.getOrDefault(change.folder(), false) && random.nextInt(4) > 0) {
                change.on(left);
            } else {
                stopped.put(change.folder(), true);
            }
        }
        left.forEach((path, node) -> after.names.put(path, node.survivor(random)));
        after.durableNames.putAll(after.names);
        return after;
    }

    private boolean stopsHere() {
        steps++;
        return stepsLeft-- == 0;
    }

    private void step() throws IOException {
        if (stopsHere()) {
            stop();
        }
    }

    private void stop() throws IOException {
        if (errorsInsteadOfCrash) {
            throw new IOException("No space left on device");
        }
        throw new Crash();
    }

    private void change(NameChange change) {
        change.on(names);
        pending.add(change);
    }

    private void add(Node node, byte[] bytes) throws IOException {
        boolean stops = stopsHere();
        int length = stops ? random.nextInt(bytes.length + 1) : bytes.length;
        int before = node.live.length;
        node.live = Arrays.copyOf(node.live, before + length);
        System.arraycopy(bytes, 0, node.live, before, length);
        if (stops) {
            stop();
        }
    }

    private Node node(Path file) throws IOException {
        Node node = names.get(file);
        if (node == null) {
            throw new NoSuchFileException(file.toString());
        }
        return node;
    }

    @Override
    public boolean exists(Path file) {
        return names.containsKey(file);
    }

    @Override
    public long size(Path file) throws IOException {
        return node(file).live.length;
    }

    @Override
    public byte[] read(Path file) throws IOException {
        return node(file).live.clone();
    }

    @Override
    public List<String> list(Path folder) {
        return names.keySet().stream().filter(path -> path.startsWith(folder) && !path.equals(folder))
                .map(path -> path.getName(folder.getNameCount()).toString()).distinct().toList();
    }

    @Override
    public void createFolders(Path folder) throws IOException {
        step();
    }

    @Override
    public void write(Path file, byte[] bytes) throws IOException {
        step();
        if (!names.containsKey(file)) {
            change(new NameChange(file.getParent(), null, file, new Node()));
        }
        Node node = names.get(file);
        node.live = new byte[0];
        add(node, bytes);
        step();
        node.force();
    }

    @Override
    public void moveOver(Path from, Path to) throws IOException {
        step();
        change(new NameChange(to.getParent(), from, to, node(from)));
    }

    @Override
    public void delete(Path file) throws IOException {
        step();
        change(new NameChange(file.getParent(), file, null, null));
    }

    @Override
    public void forceFolder(Path folder) throws IOException {
        step();
        pending.removeIf(change -> {
            if (change.folder().equals(folder)) {
                change.on(durableNames);
                return true;
            }
            return false;
        });
    }

    @Override
    public Appending append(Path file) throws IOException {
        Node node = node(file);
        return new Appending() {
            @Override
            public void append(byte[] bytes) throws IOException {
                add(node, bytes);
                step();
                node.force();
            }

            @Override
            public void truncate(long length) throws IOException {
                step();
                node.live = Arrays.copyOf(node.live, (int) length);
                step();
                node.force();
            }

            @Override
            public long length() {
                return node.live.length;
            }

            @Override
            public void close() {
                // Nothing is held open in memory.
            }
        };
    }

    @Override
    public Optional<Closeable> hold(Path lockFile) throws IOException {
        step();
        return held.add(lockFile) ? Optional.of(() -> held.remove(lockFile)) : Optional.empty();
    }
}
