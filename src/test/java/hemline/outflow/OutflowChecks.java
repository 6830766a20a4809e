package hemline.outflow;

import hemline.checks.CheckList;
import hemline.checks.OutsideCheck;
import hemline.checks.OutsideCheck.Basis;
import hemline.numerics.Estimate;
import java.util.List;

/** Outside checks of moist-air thermodynamics and density-current theory. */
public final class OutflowChecks {
    private static final double K0 = MoistAir.ZERO_CELSIUS_K;
    private static final String BOLTON = "Bolton (1980)";

    private OutflowChecks() {
    }

    public static List<OutsideCheck> list() {
        CheckList moist = new CheckList("Moist air");
        vapour(moist);
        potential(moist);
        atmosphere(moist);
        CheckList theory = new CheckList("Density currents");
        fronts(theory);
        spreading(theory);
        speeds(theory);
        return java.util.stream.Stream.of(moist, theory).flatMap(list -> list.checks().stream()).toList();
    }

    private static void vapour(CheckList list) {
        String[][] metpy = {{"5", "8.72"}, {"10", "12.27"}, {"18", "20.63"}, {"25", "31.67"}};
        for (String[] row : metpy) {
            list.from(Basis.READ, BOLTON + ", eq. 10, public tests of MetPy").check("saturation pressure, hPa",
                    row[0] + " °C", row[1], 0.005, () -> MoistAir.saturationPressureHpa(Double.parseDouble(row[0])));
        }
        String[][] wmo = {{"10", "12.2603"}, {"20", "23.3260"}, {"30", "42.3372"}};
        for (String[] row : wmo) {
            double expected = Double.parseDouble(row[1]);
            list.from(Basis.CALCULATED, "WMO-No. 8, annex 4.B, another formula").check("saturation pressure, hPa",
                    row[0] + " °C, within 0.3 %", row[1], Math.round(30 * expected) / 1e4,
                    () -> MoistAir.saturationPressureHpa(Double.parseDouble(row[0])));
        }
        list.from(Basis.READ, "IAPWS-IF97, table 35").check("saturation pressure, hPa", "300 K, within 0.2 %",
                "35.3658941", 0.07, () -> MoistAir.saturationPressureHpa(300 - K0));
        list.from(Basis.READ, "Wexler (1976), abstract").check("saturation pressure at the triple point, hPa", "273.16 K",
                "6.11657", 0.002, () -> MoistAir.saturationPressureHpa(0.01));
        list.from(Basis.FROM_MEMORY, "older WMO table after Goff and Gratch").check("saturation pressure, hPa",
                "20 °C, within 0.1 %", "23.373", 0.023, () -> MoistAir.saturationPressureHpa(20));
        list.from(Basis.CALCULATED, "IAPWS-IF97, eq. 30").check("greatest relative difference of saturation pressure, %",
                "0 to 40 °C", "0", 0.2, OutflowChecks::worstAgainstIf97);
    }

    /** IAPWS-IF97, region 4, eq. 30; its own values of table 35 are asserted in the test of this class. */
    static double if97SaturationPa(double temperatureK) {
        double[] n = {0.11670521452767e4, -0.72421316703206e6, -0.17073846940092e2, 0.12020824702470e5,
            -0.32325550322333e7, 0.14915108613530e2, -0.48232657361591e4, 0.40511340542057e6, -0.23855557567849,
            0.65017534844798e3};
        double theta = temperatureK + n[8] / (temperatureK - n[9]);
        double a = theta * theta + n[0] * theta + n[1];
        double b = n[2] * theta * theta + n[3] * theta + n[4];
        double c = n[5] * theta * theta + n[6] * theta + n[7];
        return 1e6 * Math.pow(2 * c / (-b + Math.sqrt(b * b - 4 * a * c)), 4);
    }

    private static double worstAgainstIf97() {
        double worst = 0;
        for (double t = 0; t <= 40; t += 0.5) {
            double percent = 100 * (100 * MoistAir.saturationPressureHpa(t) / if97SaturationPa(t + K0) - 1);
            worst = Math.max(worst, Math.abs(percent));
        }
        return worst;
    }

    private static void potential(CheckList list) {
        String metpy = "public tests of MetPy";
        list.from(Basis.READ, BOLTON + ", eq. 39, " + metpy)
                .check("θe, K", "1000 hPa, 293 K, dew point 280 K", "311.1859", 0.002,
                        () -> MoistAir.equivalentPotentialTemperatureK(293, 280, 1000))
                .check("θe, K", "850 hPa, 20 °C, dew point 18 °C", "353.938", 0.03,
                        () -> MoistAir.equivalentPotentialTemperatureK(20 + K0, 18 + K0, 850));
        list.from(Basis.CALCULATED, BOLTON + ", eq. 39")
                .check("θe, K", "1000 hPa, 30 °C, dew point 20 °C", "347.545", 0.005,
                        () -> MoistAir.equivalentPotentialTemperatureK(30 + K0, 20 + K0, 1000));
        list.from(Basis.CALCULATED, BOLTON + ", eq. 43")
                .check("θe, K", "1000 hPa, 30 °C, dew point 20 °C", "347.523", 0.005,
                        () -> MoistAir.equivalentPotentialTemperatureSimpleK(30 + K0, 20 + K0, 1000));
        double vapour = MoistAir.saturationPressureHpa(20);
        list.from(Basis.CALCULATED, BOLTON + ", eqs. 15, 21 and 22")
                .check("condensation temperature, K", "30 °C, dew point 20 °C", "290.815", 0.001,
                        () -> MoistAir.condensationTemperatureK(30 + K0, 20 + K0))
                .check("condensation temperature, K", "30 °C, its vapour pressure", "290.814", 0.001,
                        () -> MoistAir.condensationTemperatureFromVapourK(30 + K0, vapour))
                .check("condensation temperature, K", "30 °C, its relative humidity", "290.847", 0.001,
                        () -> MoistAir.condensationTemperatureFromHumidityK(30 + K0,
                                100 * vapour / MoistAir.saturationPressureHpa(30)));
        list.from(Basis.READ, metpy)
                .check("virtual temperature, K", "288 K, 1.6 g/kg", "288.2796", 1e-3,
                        () -> MoistAir.densityTemperatureK(288, 0.0016, 0))
                .check("potential temperature, K", "800 hPa, 293 K", "312.2886", 1e-3,
                        () -> MoistAir.potentialTemperatureK(293, 800))
                .check("potential temperature, K", "900 hPa, 278 K", "286.496", 1e-3,
                        () -> MoistAir.potentialTemperatureK(278, 900));
    }

    private static void atmosphere(CheckList list) {
        String[][] rows = {{"0", "288.15", "1013.25", "1.2250"}, {"1000", "281.651", "898.763", "1.1117"},
            {"2000", "275.154", "795.014", "1.0066"}, {"3000", "268.659", "701.212", "0.9093"},
            {"5000", "255.676", "540.483", "0.7364"}};
        for (String[] row : rows) {
            double altitude = Double.parseDouble(row[0]);
            list.from(Basis.CALCULATED, "U.S. Standard Atmosphere 1976, table I")
                    .check("temperature, K", row[0] + " m", row[1], 0.001, () -> StandardAtmosphere.temperatureK(altitude))
                    .check("pressure, hPa", row[0] + " m", row[2], 0.001, () -> StandardAtmosphere.pressureHpa(altitude))
                    .check("density, kg/m³", row[0] + " m", row[3], 1e-4, () -> StandardAtmosphere.densityKgM3(altitude));
        }
    }

    private static void fronts(CheckList list) {
        String[][] benjamin = {{"0.1", "1.24681", "0.39428"}, {"0.25", "1.02470", "0.51235"}, {"0.5", "0.70711", "0.5"}};
        for (String[] row : benjamin) {
            double a = Double.parseDouble(row[0]);
            list.from(Basis.CALCULATED, "Benjamin (1968)")
                    .check("k", "h/H " + row[0], row[1], 5e-6, () -> FrontLaw.BENJAMIN.froude(a))
                    .check("U/√(g′H)", "h/H " + row[0], row[2], 5e-6, () -> FrontLaw.BENJAMIN.froude(a) * Math.sqrt(a));
        }
        list.from(Basis.CALCULATED, "Benjamin (1968)")
                .check("greatest U/√(g′H)", "over h/H", "0.527320", 5e-6, () -> fastest()[1])
                .check("h/H of the greatest U/√(g′H)", "", "0.347296", 5e-5, () -> fastest()[0]);
        list.from(Basis.READ, "Benjamin (1968), abstract: without dissipation the interface lies midway, U = √(g′H)/2")
                .check("U/√(g′H)", "h/H 0.5, no dissipation", "0.5", 1e-12,
                        () -> FrontLaw.BENJAMIN.froude(0.5) * Math.sqrt(0.5));
        list.from(Basis.CALCULATED, "von Kármán (1940)").check("k", "deep air", "1.41421", 5e-6,
                () -> FrontLaw.DEEP.froude(Double.NaN));
        String[][] huppert = {{"0.05", "1.19"}, {"0.1", "1.07722"}, {"0.2", "0.85499"}, {"0.5", "0.62996"}, {"1", "0.5"}};
        for (String[] row : huppert) {
            list.from(Basis.FROM_MEMORY, "Huppert and Simpson (1980)").check("k", "h/H " + row[0], row[1], 1e-5,
                    () -> FrontLaw.HUPPERT_SIMPSON.froude(Double.parseDouble(row[0])));
        }
        list.from(Basis.READ, "Simpson and Britter (1980), abstract: about three fifths")
                .check("slowing by a head wind, share of the wind", "", "0.6", 0.05, () -> -DensityCurrent.groundSpeedMs(
                        new Estimate(10, 0), new Estimate(-1, 0)).value() + 10);
        list.from(Basis.READ, "Liu and Moncrieff (1996): about three quarters")
                .check("slowing by a head wind, standard deviations from the share taken", "", "0", 2,
                        () -> (0.75 - DensityCurrent.WIND_SHARE.value()) / DensityCurrent.WIND_SHARE.sd());
    }

    private static double[] fastest() {
        double[] best = {0, 0};
        for (double a = 0.3; a < 0.4; a += 1e-6) {
            double u = FrontLaw.BENJAMIN.froude(a) * Math.sqrt(a);
            if (u > best[1]) {
                best = new double[] {a, u};
            }
        }
        return best;
    }

    private static void spreading(CheckList list) {
        String[][] rows = {{"PLANE_BOX", "1.47150", "1.1008"}, {"AXISYMMETRIC_BOX", "1.15878", "0.9321"},
            {"PLANE_SIMILARITY", "1.60965", "1.1397"}, {"AXISYMMETRIC_SIMILARITY", "1.29255", "0.9703"}};
        for (String[] row : rows) {
            SpreadingLaw law = SpreadingLaw.valueOf(row[0]);
            String inputs = row[0].toLowerCase(java.util.Locale.ROOT).replace('_', ' ');
            list.from(Basis.CALCULATED, law.name().endsWith("BOX") ? "Huppert and Simpson (1980)" : "Hoult (1972)")
                    .check("spreading constant", inputs + ", k 1.19", row[1], 1e-4, () -> law.constant(1.19))
                    .check("spreading constant", inputs + ", k 0.77", row[2], 1e-4, () -> law.constant(0.77));
        }
    }

    private static void speeds(CheckList list) {
        String[][] rows = {{"0.7", "8.951"}, {"0.77", "9.846"}, {"1", "12.787"}, {"1.41421356", "18.083"}};
        for (String[] row : rows) {
            list.from(Basis.CALCULATED, "c = k √(g′h), g 9.81").check("speed, m/s", "5 K of 300 K, 1 km, k " + row[0],
                    row[1], 1e-3, () -> speed(Double.parseDouble(row[0]), 9.81 * 5 / 300, 1000));
        }
        list.from(Basis.CALCULATED, "Δp = ρ g′ h, g 9.81").check("pressure rise, hPa", "5 K of 300 K, 1 km, 1.1 kg/m³",
                "1.80", 0.005, () -> DensityCurrent.hydrostaticRiseHpa(sure(1.1), sure(9.81 * 5 / 300), sure(1000)).value());
        list.from(Basis.READ, "Mahoney (1988), abstract: mean speed of 30 Colorado fronts")
                .check("speed, m/s", "their mean drop 3.5 K and head 1.3 km, k 0.7 and 0.77 on average", "8.6", 1,
                        () -> (meanMahoney(0.7) + meanMahoney(0.77)) / 2);
        list.from(Basis.CALCULATED, "ρU²/2").check("stagnation pressure, hPa", "1.1 kg/m³, 10 m/s", "0.55", 1e-4,
                        () -> DensityCurrent.stagnationPressureHpa(sure(1.1), sure(10)).value())
                .check("stagnation pressure, hPa", "1.1 kg/m³, 15 m/s", "1.2375", 1e-4,
                        () -> DensityCurrent.stagnationPressureHpa(sure(1.1), sure(15)).value());
        list.from(Basis.CALCULATED, "propagation of error").check("relative uncertainty of the speed, %",
                "20 % in k, 30 % in deficit, 40 % in depth", "32", 0.5, () -> 100 * DensityCurrent.speedMs(
                        Estimate.relative(0.77, 0.2), Estimate.relative(0.16, 0.3), Estimate.relative(1000, 0.4))
                        .relativeSd());
    }

    private static double meanMahoney(double k) {
        return speed(k, 9.81 * 3.5 / 300, 1300);
    }

    private static double speed(double k, double reducedGravity, double depthM) {
        return DensityCurrent.speedMs(sure(k), sure(reducedGravity), sure(depthM)).value();
    }

    private static Estimate sure(double value) {
        return new Estimate(value, 0);
    }
}
