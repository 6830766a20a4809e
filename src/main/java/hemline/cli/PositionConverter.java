package hemline.cli;

import hemline.geodesy.GeoPoint;
import hemline.workflow.ReadChoices.Position;
import picocli.CommandLine.ITypeConverter;
import picocli.CommandLine.TypeConversionException;

/** A radar's position written {@code LAT,LON,ALT}: degrees north, degrees east, metres above mean sea level. */
final class PositionConverter implements ITypeConverter<Position> {
    @Override
    public Position convert(String text) {
        String[] parts = text.split(",", -1);
        if (parts.length != 3) {
            throw new TypeConversionException("'" + text + "' is not of the form LAT,LON,ALT, for example "
                    + "41.73,-93.72,314");
        }
        double altitude = DecimalNumber.parse(parts[2], "altitude");
        if (!(altitude >= -500 && altitude <= 9000)) {
            throw new TypeConversionException("the altitude must lie within -500..9000 m, got " + parts[2]);
        }
        try {
            return new Position(new GeoPoint(DecimalNumber.parse(parts[0], "latitude"),
                    DecimalNumber.parse(parts[1], "longitude")), altitude);
        } catch (IllegalArgumentException e) {
            throw new TypeConversionException(e.getMessage());
        }
    }
}
