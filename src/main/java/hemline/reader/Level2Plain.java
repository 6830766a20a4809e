package hemline.reader;

import java.io.EOFException;
import java.io.IOException;
import java.io.InputStream;
import java.nio.ByteBuffer;
import java.util.ArrayList;
import java.util.List;

/** An archive of messages that are not packed one by one, streamed: of a file of any size one message is held. */
final class Level2Plain implements Level2Messages {
    private static final long MOST_BYTES = 2L << 30;
    /** The metadata before the first radial take 134 frames; this is fifty times that. */
    private static final long MOST_BYTES_WITHOUT_RADIAL = 16L << 20;

    private final InputFile file;
    private final Content content;
    private final List<String> notes = new ArrayList<>();

    Level2Plain(InputFile file, Content content) {
        this.file = file;
        this.content = content;
    }

    @Override
    public String packing() {
        return "";
    }

    @Override
    public List<String> notes() {
        return List.copyOf(notes);
    }

    @Override
    public void visit(Level2Position from, Level2Position to, Visitor visitor) throws UnreadableFileException {
        file.shield("", () -> {
            try (InputStream in = content.stream()) {
                in.skipNBytes(VOLUME_HEADER_BYTES + from.offset());
                visit(in, from.offset(), to.record() > 0 ? Long.MAX_VALUE : to.offset(), visitor);
            } catch (EOFException e) {
                note("the file ends inside a message");
            } catch (IOException e) {
                note("the file is damaged or cut off (" + e.getMessage() + ")");
            }
            return null;
        });
    }

    private void note(String text) {
        if (!notes.contains(text)) {
            notes.add(text);
        }
    }

    private void visit(InputStream in, long at, long to, Visitor visitor) throws IOException, UnreadableFileException {
        byte[] head = new byte[CHANNEL_BYTES + HEADER_BYTES];
        ByteBuffer words = ByteBuffer.wrap(head);
        long radialAt = at;
        byte[] body = new byte[FRAME_BYTES];
        while (at < to) {
            int got = in.readNBytes(head, 0, head.length);
            if (got < head.length) {
                return;
            }
            int frame = Level2Messages.frameBytes(words, 0);
            int rest = (frame == 0 ? FRAME_BYTES : frame) - head.length;
            body = body.length < rest ? new byte[rest] : body;
            int read = in.readNBytes(body, 0, rest);
            int type = Level2Messages.type(words, 0);
            ByteBuffer whole = ByteBuffer.wrap(body, 0, read).slice();
            if (frame > 0 && Level2Messages.isPattern(type)) {
                visitor.pattern(whole);
            } else if (frame > 0 && Level2Messages.isRadial(type) && (read == rest || type == DIGITAL_RADAR_DATA)) {
                radialAt = at;
                if (!visitor.radial(type, whole, new Level2Position(0, at))) {
                    return;
                }
            }
            if (read < rest) {
                throw new EOFException();
            }
            at += head.length + rest;
            if (at - radialAt > MOST_BYTES_WITHOUT_RADIAL || at > MOST_BYTES) {
                note("nothing was read beyond byte " + at + ", where no more radials follow");
                return;
            }
        }
    }
}
