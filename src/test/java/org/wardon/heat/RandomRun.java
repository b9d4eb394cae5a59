package org.wardon.heat;

import java.time.LocalTime;
import java.util.ArrayList;
import java.util.EnumSet;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Set;
import java.util.SplittableRandom;
import org.wardon.air.SaturatedAir;
import org.wardon.air.Site;
import org.wardon.air.Weather;
import org.wardon.cooling.Compressor;
import org.wardon.cooling.Control;
import org.wardon.cooling.Cooler;
import org.wardon.cooling.Defrost;
import org.wardon.cooling.EvaporativePad;
import org.wardon.cooling.IceBank;
import org.wardon.cooling.NightAir;
import org.wardon.cooling.Outage;
import org.wardon.cooling.Recharge;
import org.wardon.cooling.Setting;
import org.wardon.cooling.WaterFilm;
import org.wardon.cooling.WettedWall;
import org.wardon.enclosure.Beyond;
import org.wardon.enclosure.Box;
import org.wardon.enclosure.Door;
import org.wardon.enclosure.Enclosure;
import org.wardon.enclosure.Face;
import org.wardon.enclosure.FaceName;
import org.wardon.enclosure.Gains;
import org.wardon.enclosure.Layer;
import org.wardon.lots.Item;
import org.wardon.lots.Lot;
import org.wardon.lots.PackageFit;
import org.wardon.lots.Packing;
import org.wardon.lots.RespirationLaw;
import org.wardon.lots.Shape;
import org.wardon.lots.TranspirationLaw;

/**
 * A chamber drawn from a seed for a day: any build, any coolers, up to three lots. A quiet one has
 * nothing inside that gives heat, and no sun on it.
 */
final class RandomRun {
    private static final double DAY_S = 86_400;
    private static final Set<FaceName> WALLS = WaterChambers.WALLS;

    private static final Layer SHEET = new Layer("steel", 0.0006, 50, 7_800, 500);
    private static final Layer STILL_AIR = new Layer("air", 0.05, 0.28, 0, 0);
    private static final Layer BRICK = new Layer("brick", 0.2, 0.8, 1_800, 900);
    private static final Layer FOAM = new Layer("foam", 0.1, 0.028, 35, 1_400);
    private static final Layer THATCH = new Layer("thatch", 0.08, 0.07, 200, 1_500);
    private static final List<List<Layer>> BUILDS =
            List.of(
                    List.of(SHEET),
                    List.of(SHEET, STILL_AIR),
                    List.of(BRICK),
                    List.of(THATCH),
                    List.of(FOAM),
                    List.of(SHEET, FOAM, SHEET),
                    List.of(SHEET, FOAM, SHEET),
                    List.of(BRICK, FOAM));

    private final SplittableRandom random;
    private final boolean quiet;

    /** Without the sun that a chamber stands in. */
    private final boolean shaded;

    private RandomRun(long seed) {
        random = new SplittableRandom(seed);
        quiet = random.nextInt(3) == 0;
        shaded = quiet || random.nextBoolean();
    }

    /** The run of a seed. */
    static ChamberRun of(long seed) {
        return new RandomRun(seed).run();
    }

    /** Whether the chamber of a run has nothing that gives heat. */
    static boolean quiet(ChamberRun run) {
        return run.enclosure().gains().equals(Gains.NONE)
                && run.enclosure().faces().stream()
                        .noneMatch(face -> face.beyond() instanceof Beyond.Outdoors)
                && run.coolers().stream().allMatch(c -> c.mostElectricW() == 0)
                && run.stays().stream().allMatch(s -> s.lot().respiration().wattsPerKg(20) == 0);
    }

    @SafeVarargs
    private <T> T one(T... of) {
        return of[random.nextInt(of.length)];
    }

    private double logarithmic(double low, double high) {
        return Math.exp(random.nextDouble(Math.log(low), Math.log(high)));
    }

    private ChamberRun run() {
        double meanC = random.nextDouble(-5, 38);
        Weather weather = weather(meanC);
        Site site =
                new Site(random.nextDouble(-50, 50), 10, one(0.0, 1_800.0, 3_500.0), Chambers.ZONE);
        double setC = random.nextDouble(0, 25);
        ChamberRun run =
                ChamberRun.of(
                                "north",
                                site,
                                Chambers.TIMELINE,
                                weather,
                                enclosure(),
                                new Setting(setC, random.nextDouble(0.3, 2), 90),
                                DAY_S)
                        .withCoolers(coolers())
                        .withStays(stays(meanC))
                        .withOutages(outages());
        // A start of its own spares the days that warm the faces up; one in eight does them.
        return random.nextInt(8) == 0
                ? run
                : run.withStart(Start.at(meanC, random.nextDouble(20, 95)));
    }

    private Weather weather(double meanC) {
        double swingK = random.nextDouble(0, 12);
        double pa = random.nextDouble(0.1, 1) * SaturatedAir.overWaterPa(meanC);
        int hours = 27;
        double[] t = new double[hours];
        double[] rh = new double[hours];
        double[] sun = new double[hours];
        double[] wind = new double[hours];
        boolean windKnown = random.nextBoolean();
        for (int h = 0; h < hours; h++) {
            t[h] = meanC + swingK * Math.cos(2 * Math.PI * (h - 15) / 24);
            rh[h] = Math.min(100, 100 * pa / SaturatedAir.overWaterPa(t[h]));
            double height = Math.cos(2 * Math.PI * (h % 24 - 12) / 24);
            sun[h] = shaded ? 0 : Math.max(0, 850 * height);
            wind[h] = windKnown ? random.nextDouble(0, 9) : Double.NaN;
        }
        return new Weather(t, rh, sun, wind);
    }

    private Enclosure enclosure() {
        Box box =
                new Box(
                        random.nextDouble(0.6, 8),
                        random.nextDouble(0.6, 6),
                        random.nextDouble(0.6, 4));
        Gains gains =
                quiet ? Gains.NONE : new Gains(one(0.0, 200.0), 3, one(0.0, 4.0), one(0.0, 100.0));
        Optional<Door> door =
                quiet || random.nextBoolean() ? Optional.empty() : Optional.of(door(box));
        return new Enclosure(
                box,
                faces(),
                random.nextDouble(0, 20),
                door,
                one(0.0, 2.0, 30.0),
                one(0.0, 0.0, 60.0),
                gains,
                one(0.0, 50_000.0, 300_000.0),
                random.nextBoolean());
    }

    private Door door(Box box) {
        return new Door(
                Math.min(1, box.widthM()),
                Math.min(2, box.heightM()),
                one(4.0, 20.0, 60.0),
                one(20.0, 60.0, 600.0),
                LocalTime.of(7, 0),
                LocalTime.of(19, 0),
                one(0.0, 0.8),
                "none",
                new Beyond.Outdoors());
    }

    private List<Face> faces() {
        List<Face> faces = new ArrayList<>();
        for (FaceName name : FaceName.values()) {
            List<Layer> layers = BUILDS.get(random.nextInt(BUILDS.size()));
            Beyond beyond = shaded ? new Beyond.Shade() : new Beyond.Outdoors();
            if (name == FaceName.FLOOR) {
                beyond = one(new Beyond.Ground(), new Beyond.Shade());
            } else if (random.nextInt(6) == 0) {
                beyond = new Beyond.Space(random.nextDouble(5, 35));
            }
            faces.add(new Face(name, beyond, looks(name), random.nextDouble(0.2, 0.9), layers));
        }
        return faces;
    }

    private static double looks(FaceName name) {
        return switch (name) {
            case EAST -> 90;
            case SOUTH -> 180;
            case WEST -> 270;
            default -> 0;
        };
    }

    private List<Cooler> coolers() {
        List<Cooler> coolers = new ArrayList<>();
        for (int n = one(0, 1, 1, 1, 2); n > 0; n--) {
            Cooler next = cooler();
            boolean taken = coolers.stream().anyMatch(c -> c.kind().equals(next.kind()));
            boolean bothWet = next instanceof WettedWall || next instanceof WaterFilm;
            if (!taken && !(bothWet && !coolers.isEmpty())) {
                coolers.add(next);
            }
        }
        return coolers;
    }

    private double fan(double watts) {
        return quiet ? 0 : watts;
    }

    private Cooler cooler() {
        Control control = one(Control.values());
        double flow = logarithmic(0.01, 1.5);
        return switch (random.nextInt(6)) {
            case 0 ->
                    new EvaporativePad(
                            random.nextDouble(0.3, 1), flow, fan(200 * flow), 20, control);
            case 1 ->
                    new NightAir(
                            flow,
                            fan(200 * flow),
                            random.nextDouble(0, 4),
                            random.nextDouble(-8, 8),
                            random.nextDouble(0, 40),
                            random.nextDouble(70, 100),
                            control);
            case 2 -> ice(control);
            case 3 -> wetted();
            case 4 -> film(control);
            default -> quiet ? ice(control) : compressor(control);
        };
    }

    private IceBank ice(Control control) {
        double full = logarithmic(5, 2_000);
        double coldW = logarithmic(200, 8_000);
        Recharge night = new Recharge(coldW, 0.4 * coldW, LocalTime.of(21, 0), LocalTime.of(5, 0));
        return new IceBank(
                full,
                one(full, random.nextDouble(0, full)),
                one(
                        IceBank.Material.ICE,
                        new IceBank.Material(
                                random.nextDouble(-8, 8), random.nextDouble(150, 340))),
                logarithmic(5, 400),
                fan(one(0.0, 40.0)),
                quiet || random.nextBoolean() ? Optional.empty() : Optional.of(night),
                control);
    }

    private Set<FaceName> some(Set<FaceName> of) {
        List<FaceName> names = new ArrayList<>(of);
        names.sort(null);
        while (names.size() > 1 && random.nextInt(3) > 0) {
            names.remove(random.nextInt(names.size()));
        }
        return EnumSet.copyOf(names);
    }

    private WettedWall wetted() {
        return new WettedWall(
                some(WALLS), one(0.0, 2.0, 50.0, 500.0), random.nextDouble(), WaterChambers.TWICE);
    }

    private WaterFilm film(Control control) {
        boolean open = random.nextBoolean();
        Optional<WaterFilm.Chiller> chiller =
                quiet || random.nextBoolean()
                        ? Optional.empty()
                        : Optional.of(new WaterFilm.Chiller(logarithmic(50, 8_000), 0.45, 6, 12));
        return new WaterFilm(
                some(open ? WALLS : EnumSet.allOf(FaceName.class)),
                logarithmic(1e-3, 10),
                List.of(random.nextDouble(0.5, 25)),
                chiller,
                fan(one(0.0, 100.0)),
                open,
                random.nextDouble(2, 50),
                control);
    }

    private Compressor compressor(Control control) {
        double capacityW = logarithmic(300, 12_000);
        return new Compressor(
                capacityW,
                0.4 * capacityW,
                one(0.0, 10.0),
                35,
                0.04 * capacityW,
                random.nextInt(4) == 0,
                capacityW / random.nextDouble(4, 10),
                capacityW / 6_000,
                control,
                one(0.0, 3.0),
                one(0.0, 3.0),
                3,
                -30,
                random.nextInt(4) == 0
                        ? Optional.of(new Defrost(6, 20, one(0.0, 800.0)))
                        : Optional.empty(),
                random.nextInt(5) == 0
                        ? OptionalDouble.of(random.nextDouble(0.5, 10))
                        : OptionalDouble.empty());
    }

    private List<Outage> outages() {
        if (random.nextInt(4) > 0) {
            return List.of();
        }
        double fromS = random.nextDouble(0, 0.7 * DAY_S);
        return List.of(new Outage(fromS, fromS + random.nextDouble(600, 30_000)));
    }

    private List<Stay> stays(double meanC) {
        List<Stay> stays = new ArrayList<>();
        for (int i = random.nextInt(4); i > 0; i--) {
            Lot lot = lot("L" + i, logarithmic(5, 2_000));
            double arrivesS = one(0.0, random.nextDouble(0, 0.8 * DAY_S));
            double leavesS =
                    random.nextInt(3) == 0
                            ? arrivesS + random.nextDouble(3_600, DAY_S)
                            : Double.POSITIVE_INFINITY;
            double pulpC = Math.min(45, Math.max(1, meanC + random.nextDouble(-12, 12)));
            double wetKg = random.nextInt(5) == 0 ? 0.01 * lot.massKg() : 0;
            stays.add(new Stay(lot, arrivesS, leavesS, pulpC, Double.NEGATIVE_INFINITY, wetKg));
        }
        return stays;
    }

    private Lot lot(String id, double kg) {
        double radiusM = logarithmic(0.004, 0.09);
        Item item = new Item(one(Shape.values()), radiusM, 900, 3_700, 0.5, 0.15);
        // Slower by its package than bare, and no wider a path for vapour than the air that carries
        // the heat gives (Lewis), which the fit sees to.
        Packing bare =
                new Packing(8 * item.areaM2PerKg(), 100, 1e-3, 100, logarithmic(2e-11, 2e-9));
        Packing packing = PackageFit.slowed(item, bare, logarithmic(1.2, 20));
        TranspirationLaw water =
                new TranspirationLaw(logarithmic(5e-12, 2e-9), random.nextDouble(0.97, 1), 2e-9);
        return new Lot(id, kg, item, packing, breath(quiet ? 0 : logarithmic(0.003, 0.1)), water);
    }

    /** Flat above 30 °C, as the laws of commodities are: a lot does not burn. */
    private static RespirationLaw breath(double wattsPerKgAtZero) {
        RespirationLaw rising = Chambers.breath(wattsPerKgAtZero, 0.08);
        return new RespirationLaw() {
            @Override
            public double wattsPerKg(double temperatureC) {
                return rising.wattsPerKg(Math.min(temperatureC, 30));
            }

            @Override
            public double slopeWattsPerKgK(double temperatureC) {
                return temperatureC < 30 ? rising.slopeWattsPerKgK(temperatureC) : 0;
            }
        };
    }
}
