package plateledger.report;

import java.io.ByteArrayOutputStream;
import java.nio.ByteBuffer;
import java.nio.charset.StandardCharsets;
import java.util.ArrayDeque;
import java.util.ArrayList;
import java.util.Deque;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.TreeMap;
import java.util.TreeSet;

/**
 * Cuts a TrueType font down to the characters of a text, so that a page can carry its typeface without carrying six thousand
 * glyphs. Tables as in the OpenType specification 1.9 (ISO/IEC 14496-22); layout tables (kerning, ligatures) are left out,
 * the name table with its copyright notice is kept whole.
 */
final class FontSubset {
    private static final List<String> COPIED = List.of("OS/2", "cvt ", "fpgm", "name", "prep");
    private static final int TABLE_RECORD = 16;
    private static final int LOCATION_FORMAT_AT = 50; // head.indexToLocFormat
    private static final int CHECKSUM_AT = 8; // head.checkSumAdjustment
    private static final int CHECKSUM_MAGIC = 0xB1B0AFBA;
    private static final int METRICS_COUNT_AT = 34; // hhea.numberOfHMetrics
    private static final int GLYPH_COUNT_AT = 4; // maxp.numGlyphs

    // Flags of a component in a composite glyph.
    private static final int WORDS = 0x0001;
    private static final int SCALE = 0x0008;
    private static final int MORE = 0x0020;
    private static final int TWO_SCALES = 0x0040;
    private static final int FOUR_SCALES = 0x0080;

    private final Map<String, ByteBuffer> tables = new TreeMap<>();

    private FontSubset(byte[] font) {
        ByteBuffer all = ByteBuffer.wrap(font);
        int count = all.getShort(4) & 0xFFFF;
        for (int i = 0; i < count; i++) {
            int record = 12 + TABLE_RECORD * i;
            byte[] tag = new byte[4];
            all.get(record, tag);
            tables.put(
                    new String(tag, StandardCharsets.US_ASCII),
                    all.slice(all.getInt(record + 8), all.getInt(record + 12)));
        }
    }

    /**
     * The font with the glyphs of a text's characters alone; characters that it lacks are passed over.
     *
     * @param font a TrueType font with a Unicode character map of format 4
     * @param text the text
     */
    static byte[] of(byte[] font, String text) {
        return new FontSubset(font).cut(text);
    }

    private byte[] cut(String text) {
        TreeMap<Integer, Integer> glyphOfCharacter = new TreeMap<>();
        text.codePoints().distinct().filter(c -> c < 0xFFFF).forEach(c -> {
            int glyph = glyph(c);
            if (glyph != 0) {
                glyphOfCharacter.put(c, glyph);
            }
        });
        List<Integer> kept = List.copyOf(withComponents(glyphOfCharacter));
        Map<Integer, Integer> renumbered = new TreeMap<>();
        for (int i = 0; i < kept.size(); i++) {
            renumbered.put(kept.get(i), i);
        }
        Map<String, byte[]> cut = new TreeMap<>();
        for (String tag : COPIED) {
            ByteBuffer copied = tables.get(tag);
            if (copied != null) {
                cut.put(tag, bytes(copied));
            }
        }
        addGlyphs(cut, kept, renumbered);
        cut.put("cmap", characterMap(glyphOfCharacter, renumbered));
        cut.put("hmtx", metrics(kept));
        cut.put("hhea", withShort(table("hhea"), METRICS_COUNT_AT, kept.size()));
        cut.put("maxp", withShort(table("maxp"), GLYPH_COUNT_AT, kept.size()));
        byte[] head = withShort(table("head"), LOCATION_FORMAT_AT, 1);
        ByteBuffer.wrap(head).putInt(CHECKSUM_AT, 0);
        cut.put("head", head);
        byte[] post = new byte[32]; // version 3: no glyph names
        ByteBuffer.wrap(post).put(0, bytes(table("post")), 0, 32).putInt(0, 0x00030000);
        cut.put("post", post);
        return assemble(cut);
    }

    private ByteBuffer table(String tag) {
        ByteBuffer table = tables.get(tag);
        if (table == null) {
            throw new IllegalArgumentException("font has no table " + tag);
        }
        return table;
    }

    /** Glyph of a character by the format 4 subtable; 0 where there is none. */
    private int glyph(int character) {
        ByteBuffer map = table("cmap");
        int count = map.getShort(2) & 0xFFFF;
        for (int i = 0; i < count; i++) {
            int at = map.getInt(4 + 8 * i + 4);
            if (map.getShort(at) == 4) {
                return glyph(map, at, character);
            }
        }
        throw new IllegalArgumentException("font has no character map of format 4");
    }

    private static int glyph(ByteBuffer map, int at, int character) {
        int segments = (map.getShort(at + 6) & 0xFFFF) / 2;
        int ends = at + 14;
        int starts = ends + 2 * segments + 2;
        int deltas = starts + 2 * segments;
        int offsets = deltas + 2 * segments;
        for (int i = 0; i < segments; i++) {
            if ((map.getShort(ends + 2 * i) & 0xFFFF) < character) {
                continue;
            }
            int start = map.getShort(starts + 2 * i) & 0xFFFF;
            if (start > character) {
                return 0;
            }
            int delta = map.getShort(deltas + 2 * i);
            int offset = map.getShort(offsets + 2 * i) & 0xFFFF;
            if (offset == 0) {
                return (character + delta) & 0xFFFF;
            }
            int found = map.getShort(offsets + 2 * i + offset + 2 * (character - start)) & 0xFFFF;
            return found == 0 ? 0 : (found + delta) & 0xFFFF;
        }
        return 0;
    }

    private Set<Integer> withComponents(Map<Integer, Integer> glyphs) {
        TreeSet<Integer> all = new TreeSet<>();
        all.add(0); // the sign for a missing character comes first by definition
        Deque<Integer> open = new ArrayDeque<>(glyphs.values());
        while (!open.isEmpty()) {
            int glyph = open.remove();
            if (all.add(glyph)) {
                componentPlaces(outline(glyph))
                        .forEach(at -> open.add(outline(glyph).getShort(at) & 0xFFFF));
            }
        }
        return all;
    }

    private ByteBuffer outline(int glyph) {
        ByteBuffer places = table("loca");
        boolean wide = table("head").getShort(LOCATION_FORMAT_AT) == 1;
        int from = wide ? places.getInt(4 * glyph) : 2 * (places.getShort(2 * glyph) & 0xFFFF);
        int to = wide ? places.getInt(4 * glyph + 4) : 2 * (places.getShort(2 * glyph + 2) & 0xFFFF);
        return table("glyf").slice(from, to - from);
    }

    /** Places of the component glyph numbers in a composite outline; none in a simple one. */
    private static List<Integer> componentPlaces(ByteBuffer outline) {
        List<Integer> places = new ArrayList<>();
        if (outline.limit() == 0 || outline.getShort(0) >= 0) {
            return places;
        }
        int at = 10;
        int flags;
        do {
            flags = outline.getShort(at) & 0xFFFF;
            places.add(at + 2);
            at += 4 + ((flags & WORDS) != 0 ? 4 : 2);
            if ((flags & SCALE) != 0) {
                at += 2;
            } else if ((flags & TWO_SCALES) != 0) {
                at += 4;
            } else if ((flags & FOUR_SCALES) != 0) {
                at += 8;
            }
        } while ((flags & MORE) != 0);
        return places;
    }

    private void addGlyphs(Map<String, byte[]> cut, List<Integer> kept, Map<Integer, Integer> renumbered) {
        ByteArrayOutputStream outlines = new ByteArrayOutputStream();
        ByteBuffer places = ByteBuffer.allocate(4 * (kept.size() + 1));
        for (int glyph : kept) {
            places.putInt(outlines.size());
            byte[] outline = bytes(outline(glyph));
            ByteBuffer edited = ByteBuffer.wrap(outline);
            for (int at : componentPlaces(edited)) {
                int component = edited.getShort(at) & 0xFFFF;
                edited.putShort(
                        at, (short) renumbered.getOrDefault(component, 0).intValue());
            }
            outlines.writeBytes(outline);
            while (outlines.size() % 4 != 0) {
                outlines.write(0);
            }
        }
        places.putInt(outlines.size());
        cut.put("glyf", outlines.toByteArray());
        cut.put("loca", places.array());
    }

    private static byte[] characterMap(Map<Integer, Integer> glyphs, Map<Integer, Integer> renumbered) {
        int segments = glyphs.size() + 1; // one per character and the closing one
        int length = 16 + 8 * segments;
        ByteBuffer map = ByteBuffer.allocate(12 + length);
        map.putShort((short) 0).putShort((short) 1);
        map.putShort((short) 3).putShort((short) 1).putInt(12); // Windows, Unicode
        int power = Integer.highestOneBit(segments);
        map.putShort((short) 4).putShort((short) length).putShort((short) 0);
        map.putShort((short) (2 * segments));
        map.putShort((short) (2 * power));
        map.putShort((short) Integer.numberOfTrailingZeros(power));
        map.putShort((short) (2 * (segments - power)));
        glyphs.keySet().forEach(c -> map.putShort((short) c.intValue()));
        map.putShort((short) 0xFFFF).putShort((short) 0);
        glyphs.keySet().forEach(c -> map.putShort((short) c.intValue()));
        map.putShort((short) 0xFFFF);
        glyphs.forEach((c, glyph) -> map.putShort((short) (renumbered.getOrDefault(glyph, 0) - c)));
        map.putShort((short) 1);
        return map.array(); // the offsets that follow are all zero
    }

    private byte[] metrics(List<Integer> kept) {
        int full = table("hhea").getShort(METRICS_COUNT_AT) & 0xFFFF;
        ByteBuffer old = table("hmtx");
        ByteBuffer metrics = ByteBuffer.allocate(4 * kept.size());
        for (int glyph : kept) {
            int advance = old.getShort(4 * Math.min(glyph, full - 1));
            int bearing = glyph < full ? old.getShort(4 * glyph + 2) : old.getShort(4 * full + 2 * (glyph - full));
            metrics.putShort((short) advance).putShort((short) bearing);
        }
        return metrics.array();
    }

    private static byte[] assemble(Map<String, byte[]> cut) {
        int count = cut.size();
        int power = Integer.highestOneBit(count);
        int at = 12 + TABLE_RECORD * count;
        int size = at;
        for (byte[] table : cut.values()) {
            size += padded(table.length);
        }
        ByteBuffer font = ByteBuffer.allocate(size);
        font.putInt(0x00010000).putShort((short) count);
        font.putShort((short) (TABLE_RECORD * power));
        font.putShort((short) Integer.numberOfTrailingZeros(power));
        font.putShort((short) (TABLE_RECORD * (count - power)));
        int headAt = 0;
        for (Map.Entry<String, byte[]> table : cut.entrySet()) {
            font.put(table.getKey().getBytes(StandardCharsets.US_ASCII));
            byte[] content = new byte[padded(table.getValue().length)];
            System.arraycopy(table.getValue(), 0, content, 0, table.getValue().length);
            font.putInt(sum(content)).putInt(at).putInt(table.getValue().length);
            font.put(at, content);
            if (table.getKey().equals("head")) {
                headAt = at;
            }
            at += content.length;
        }
        font.putInt(headAt + CHECKSUM_AT, CHECKSUM_MAGIC - sum(font.array()));
        return font.array();
    }

    private static int sum(byte[] content) {
        ByteBuffer words = ByteBuffer.wrap(content);
        int sum = 0;
        while (words.hasRemaining()) {
            sum += words.getInt();
        }
        return sum;
    }

    private static int padded(int length) {
        return (length + 3) / 4 * 4;
    }

    private static byte[] withShort(ByteBuffer table, int at, int value) {
        byte[] copy = bytes(table);
        ByteBuffer.wrap(copy).putShort(at, (short) value);
        return copy;
    }

    private static byte[] bytes(ByteBuffer table) {
        byte[] copy = new byte[table.limit()];
        table.get(0, copy);
        return copy;
    }
}
