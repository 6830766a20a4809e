package hemline.export;

import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.util.List;

/**
 * {@code datapackage.json}: the tables explained for machines, a Frictionless Data Package with a Table Schema for
 * each (Data Package and Table Schema 1.0, specs.frictionlessdata.io).
 */
final class DataPackage {
    static final List<Table<?>> TABLES = List.of(BoundariesTable.TABLE, TracksTable.TABLE, MeetingsTable.TABLE);
    /** Written only when stations are given. */
    static final Table<?> PASSAGES = PassagesTable.TABLE;

    private DataPackage() {
    }

    /** The tables that are in the folder. */
    static ObjectNode describe(List<Table<?>> tables) {
        ObjectNode root = Json.object();
        root.put("profile", "tabular-data-package").put("name", "hemline-results");
        ArrayNode resources = root.putArray("resources");
        for (Table<?> table : tables) {
            resource(resources.addObject(), table);
        }
        return root;
    }

    private static void resource(ObjectNode node, Table<?> table) {
        node.put("profile", "tabular-data-resource").put("name", table.name()).put("path", table.name() + ".csv")
                .put("description", table.meaning()).put("format", "csv").put("mediatype", "text/csv")
                .put("encoding", "utf-8");
        ObjectNode schema = node.putObject("schema");
        ArrayNode fields = schema.putArray("fields");
        for (Column<?> column : table.columns()) {
            ObjectNode field = fields.addObject().put("name", column.name()).put("type", column.type().schemaName())
                    .put("description", column.meaning());
            if (column.type() == Column.Type.TIME) {
                field.put("format", "any");
            }
            if (!column.unit().isEmpty()) {
                field.put("unit", column.unit());
            }
        }
        schema.putArray("missingValues").add("");
        if (table == TracksTable.TABLE) {
            schema.put("primaryKey", "track_id");
        }
        if (table == MeetingsTable.TABLE) {
            schema.put("primaryKey", "meeting_id");
        }
        if (table == BoundariesTable.TABLE || table == PASSAGES) {
            ObjectNode key = schema.putArray("foreignKeys").addObject().put("fields", "track_id");
            key.putObject("reference").put("resource", TracksTable.TABLE.name()).put("fields", "track_id");
        }
    }
}
