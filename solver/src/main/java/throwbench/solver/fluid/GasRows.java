package throwbench.solver.fluid;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.HashMap;
import java.util.List;
import java.util.Map;

/** The rows of the gas table, with their sources. */
final class GasRows {

    /**
     * Names | molar mass, g/mol | critical temperature, K | critical pressure, Pa | acentric factor | source. The values are
     * those of each gas's reference equation of state, named by authors and year, as the library chemicals 1.5.2 collects
     * them.
     */
    private static final String CRITICAL_POINTS = """
            methane, CH4 | 16.04246 | 190.564 | 4599200 | 0.01142 | Setzmann and Wagner 1991
            ethane, C2H6 | 30.06904 | 305.322 | 4872200 | 0.0995 | Buecker and Wagner 2006
            propane, C3H8 | 44.09562 | 369.89 | 4251200 | 0.1521 | Lemmon, McLinden and Wagner 2009
            n-butane, butane, n-C4H10 | 58.1222 | 425.125 | 3796000 | 0.201 | Buecker and Wagner 2006
            isobutane, i-butane, i-C4H10 | 58.1222 | 407.81 | 3629000 | 0.184 | Buecker and Wagner 2006
            n-pentane, pentane, n-C5H12 | 72.14878 | 469.7 | 3367500 | 0.251 | Thol et al. 2019
            isopentane, i-pentane, i-C5H12 | 72.14878 | 460.35 | 3378000 | 0.2274 | Lemmon and Span 2006
            n-hexane, hexane, n-C6H14 | 86.17536 | 507.82 | 3044100 | 0.3 | Thol et al. 2019
            n-heptane, heptane, n-C7H16 | 100.20194 | 540.2 | 2735730 | 0.349 | Span and Wagner 2003
            ethylene, ethene, C2H4 | 28.05316 | 282.35 | 5041800 | 0.0866 | Smukala, Span and Wagner 2000
            propylene, propene, C3H6 | 42.07974 | 364.211 | 4555000 | 0.146 | Lemmon et al. 2013
            1-butene, 1-C4H8 | 56.10632 | 419.29 | 4005100 | 0.192 | Lemmon and Ihmels 2005
            acetylene, ethyne, C2H2 | 26.03728 | 308.3 | 5988200 | 0.178 | equation not named there
            hydrogen, H2 | 2.01588 | 33.145 | 1296400 | -0.219 | Leachman et al. 2009
            helium, He | 4.002602 | 5.1953 | 228320 | -0.3836 | Ortiz Vega 2013
            nitrogen, N2 | 28.0134 | 126.192 | 3395800 | 0.0372 | Span et al. 2000
            oxygen, O2 | 31.9988 | 154.581 | 5043000 | 0.0222 | Schmidt and Wagner 1985
            argon, Ar | 39.948 | 150.687 | 4863000 | -0.00219 | Tegeler, Span and Wagner 1999
            air | 28.96546 | 132.5306 | 3786000 | 0.0335 | Lemmon, Jacobsen, Penoncello and Friend 2000
            carbon monoxide, CO | 28.0101 | 132.86 | 3494000 | 0.0497 | Lemmon and Span 2006
            carbon dioxide, CO2 | 44.0095 | 304.1282 | 7377300 | 0.22394 | Span and Wagner 1996
            hydrogen sulfide, hydrogen sulphide, H2S | 34.08088 | 373.1 | 9000000 | 0.1005 | Lemmon and Span 2006
            sulfur dioxide, sulphur dioxide, SO2 | 64.0638 | 430.64 | 7886600 | 0.256 | Gao, Wu, Zhang and Lemmon 2016
            ammonia, NH3 | 17.03052 | 405.56 | 11363400 | 0.256 | Gao, Wu, Bell and Lemmon 2020
            nitrous oxide, N2O | 44.0128 | 309.52 | 7245000 | 0.162 | Lemmon and Span 2006
            water vapour, water, steam, water vapor, H2O | 18.01528 | 647.096 | 22064000 | 0.3443 | Wagner and Pruss 2002
            chlorine, Cl2 | 70.906 | 416.8654 | 7642400 | 0.07 | Thol et al. 2021
            hydrogen chloride, HCl | 36.46094 | 324.68 | 8313500 | 0.129 | Thol et al. 2018
            R134a, 1,1,1,2-tetrafluoroethane, C2H2F4 | 102.030893 | 374.21 | 4059280 | 0.32684 | Tillner-Roth and Baehr 1994
            """;

    /**
     * Name | from, K | to, K | a0 … a4 of c_p/R | source. A source such as "L 8/88" is NASA's own mark of a row of McBride,
     * Gordon and Reno, NASA TM-4513 (1993), low range, as the library Cantera 3.2.0 keeps it. "fit" is ours, to the ideal-gas
     * heat capacity of the reference equation of state in the library CoolProp 8.0.0, with its largest error: where NASA has
     * no row or begins at 298 K and above, too warm for a suction line in winter.
     */
    private static final String HEAT_CAPACITIES = """
            methane | 200 | 1000 | 5.14987613 -0.0136709788 4.91800599e-05 -4.84743026e-08 1.66693956e-11 | L 8/88
            ethane | 200 | 1000 | 4.29142492 -0.0055015427 5.99438288e-05 -7.08466285e-08 2.68685771e-11 | L 8/88
            propane | 200 | 1000 | 4.2110262 0.00171599803 7.06183472e-05 -9.19594116e-08 3.64421372e-11 | L 6/90
            n-butane | 200 | 1000 | 6.14746806 0.000155947389 9.67913517e-05 -1.2548391e-07 4.97816555e-11 | L 6/90
            isobutane | 200 | 1000 | 4.45479276 0.00826057985 8.29886664e-05 -1.14647642e-07 4.64570101e-11 | L 6/90
            n-pentane | 200 | 600 | 12.43683169 -0.05292091806 0.000319503604 -4.737949353e-07 2.452482883e-10 | fit 0.058 %
            isopentane | 200 | 600 | 2.610250351 0.03206321815 4.409016157e-05 -7.692045202e-08 3.189578448e-11 | fit 0.025 %
            n-hexane | 200 | 600 | 18.791735 -0.1097983715 0.0005671464113 -8.661523334e-07 4.624305202e-10 | fit 0.056 %
            n-heptane | 200 | 1000 | 11.1532484 -0.00949415433 0.000195571181 -2.4975252e-07 9.84873213e-11 | X10/85
            ethylene | 200 | 1000 | 3.95920148 -0.00757052247 5.70990292e-05 -6.91588753e-08 2.69884373e-11 | L 1/91
            propylene | 200 | 1000 | 3.83464524 0.00329078405 5.05228184e-05 -6.66251418e-08 2.63707585e-11 | L 7/90
            1-butene | 200 | 1000 | 4.42674073 0.00663946249 6.80652815e-05 -9.28753562e-08 3.73473949e-11 | X 4/88
            acetylene | 200 | 1000 | 0.808681094 0.0233615629 -3.55171815e-05 2.80152437e-08 -8.50072974e-12 | L 1/91
            hydrogen | 200 | 1000 | 2.34433112 0.00798052075 -1.9478151e-05 2.01572094e-08 -7.37611761e-12 | TPIS78
            helium | 200 | 1000 | 2.5 0.0 0.0 0.0 0.0 | L10/90
            nitrogen | 200 | 1000 | 3.53100528 -0.000123660987 -5.02999437e-07 2.43530612e-09 -1.40881235e-12 | TPIS78
            oxygen | 200 | 1000 | 3.78245636 -0.00299673415 9.847302e-06 -9.68129508e-09 3.24372836e-12 | TPIS89
            argon | 200 | 1000 | 2.5 0.0 0.0 0.0 0.0 | L 6/88
            air | 200 | 600 | 3.465888132 0.0004685506232 -2.983538662e-06 7.459409666e-09 -4.810163724e-12 | fit 0.006 %
            carbon monoxide | 200 | 1000 | 3.57953347 -0.00061035368 1.01681433e-06 9.07005884e-10 -9.04424499e-13 | TPIS79
            carbon dioxide | 200 | 1000 | 2.35677352 0.00898459677 -7.12356269e-06 2.45919022e-09 -1.43699548e-13 | L 7/88
            hydrogen sulfide | 200 | 600 | 4.337007416 -0.004157202988 1.612097735e-05 -1.857942932e-08 8.167729117e-12 | fit 0.0099 %
            sulfur dioxide | 200 | 600 | 3.770225575 0.001290086034 1.219285249e-05 -1.915833252e-08 8.491488438e-12 | fit 0.012 %
            ammonia | 200 | 1000 | 4.30177808 -0.0047712733 2.19341619e-05 -2.29856489e-08 8.28992268e-12 | TPIS89
            nitrous oxide | 200 | 1000 | 2.2571686 0.0113046338 -1.3671035e-05 9.68162098e-09 -2.93055583e-12 | L 7/88
            water vapour | 200 | 1000 | 4.19864056 -0.0020364341 6.52040211e-06 -5.48797062e-09 1.77197817e-12 | L 8/89
            chlorine | 200 | 1000 | 2.73638114 0.007835257 -1.45104963e-05 1.25730834e-08 -4.13247145e-12 | TPIS89
            hydrogen chloride | 200 | 600 | 3.467461419 0.0004246194708 -1.755282348e-06 2.756651934e-09 -9.930437645e-13 | fit 0.0039 %
            R134a | 230 | 480 | 1.710900924 0.03856797584 -4.697127656e-05 5.294346939e-08 -2.662548703e-11 | fit 0.003 %
            """;

    private GasRows() {}

    static List<Gas> all() {
        Map<String, IdealHeatCapacity> heatCapacities = new HashMap<>();
        HEAT_CAPACITIES.lines().map(GasRows::cells).forEach(row -> heatCapacities.put(row[0], heatCapacity(row)));
        List<Gas> gases = new ArrayList<>();
        for (String[] row : CRITICAL_POINTS.lines().map(GasRows::cells).toList()) {
            List<String> names = List.of(row[0].split(", ", -1));
            IdealHeatCapacity heatCapacity = heatCapacities.remove(names.get(0));
            if (heatCapacity == null) {
                throw new IllegalStateException("no heat capacity of " + names);
            }
            gases.add(gas(names, row, heatCapacity));
        }
        if (!heatCapacities.isEmpty()) {
            throw new IllegalStateException("no critical point of " + heatCapacities.keySet());
        }
        return List.copyOf(gases);
    }

    private static String[] cells(String line) {
        return line.split(" \\| ", -1);
    }

    private static Gas gas(List<String> names, String[] row, IdealHeatCapacity heatCapacity) {
        return new Gas(
                names.get(0),
                names.subList(1, names.size()),
                number(row[1]) / 1000,
                new CriticalPoint(number(row[2]), number(row[3]), number(row[4])),
                heatCapacity,
                "chemicals 1.5.2, after " + row[5]);
    }

    private static IdealHeatCapacity heatCapacity(String[] row) {
        double[] a = Arrays.stream(row[3].split(" ", -1))
                .mapToDouble(GasRows::number)
                .toArray();
        String source = row[4].startsWith("fit")
                ? "own fit to the reference equation of state in CoolProp 8.0.0, within" + row[4].substring(3)
                : "NASA TM-4513 (1993), " + row[4];
        return new IdealHeatCapacity(a[0], a[1], a[2], a[3], a[4], number(row[1]), number(row[2]), source);
    }

    private static double number(String cell) {
        return Double.parseDouble(cell);
    }
}
