package org.wardon.enclosure;

import java.util.List;
import org.apache.commons.math3.complex.Complex;

/**
 * How a face answers a sinusoidal temperature outside.
 *
 * <p>Source: ISO 13786:2017, heat transfer matrix of a homogeneous layer and of a resistance, from
 * memory.
 *
 * @param periodS period, s
 * @param transmittanceWm2K modulus of the heat flow inside over the temperature swing outside,
 *     W/(m2 K)
 * @param decrement that over the steady transmittance, 0 to 1
 * @param shiftS time shift of the heat flow inside, s; below 0 for a lag
 * @param capacityJm2K areal heat capacity of the inner side, J/(m2 K)
 */
public record PeriodicTransmittance(
        double periodS,
        double transmittanceWm2K,
        double decrement,
        double shiftS,
        double capacityJm2K) {
    /**
     * Works it out.
     *
     * @param insideToOutside layers from inside to outside
     * @param insideFilmM2KW resistance of the inner surface, m2 K/W
     * @param outsideFilmM2KW resistance of the outer surface, m2 K/W
     * @param periodS period, s, above 0
     * @return the answer
     */
    public static PeriodicTransmittance of(
            List<Layer> insideToOutside,
            double insideFilmM2KW,
            double outsideFilmM2KW,
            double periodS) {
        Matrix z = Matrix.resistance(insideFilmM2KW);
        for (Layer layer : insideToOutside) {
            z = Matrix.layer(layer, periodS).times(z);
        }
        z = Matrix.resistance(outsideFilmM2KW).times(z);
        Complex y = Complex.ONE.negate().divide(z.b);
        double lag = y.getArgument();
        // The heat flow inside follows the swing outside: its phase is counted from -2 pi to 0.
        double phase = lag > 0 ? lag - 2 * Math.PI : lag;
        double steady = UValue.wattsM2K(insideToOutside, insideFilmM2KW, outsideFilmM2KW);
        double capacity = periodS / (2 * Math.PI) * z.a.subtract(Complex.ONE).divide(z.b).abs();
        return new PeriodicTransmittance(
                periodS, y.abs(), y.abs() / steady, periodS * phase / (2 * Math.PI), capacity);
    }

    private record Matrix(Complex a, Complex b, Complex c, Complex d) {
        static Matrix resistance(double r) {
            return new Matrix(Complex.ONE, new Complex(-r), Complex.ZERO, Complex.ONE);
        }

        static Matrix layer(Layer layer, double periodS) {
            double storage = layer.densityKgM3() * layer.specificHeatJkgK();
            if (storage == 0) {
                return resistance(layer.resistanceM2KW());
            }
            double lambda = layer.conductivityWmK();
            double depth = Math.sqrt(lambda * periodS / (Math.PI * storage));
            double x = layer.thicknessM() / depth;
            double shc = Math.sinh(x) * Math.cos(x);
            double chs = Math.cosh(x) * Math.sin(x);
            Complex diagonal = new Complex(Math.cosh(x) * Math.cos(x), Math.sinh(x) * Math.sin(x));
            Complex up = new Complex(shc + chs, chs - shc).multiply(-depth / (2 * lambda));
            Complex down = new Complex(shc - chs, shc + chs).multiply(-lambda / depth);
            return new Matrix(diagonal, up, down, diagonal);
        }

        Matrix times(Matrix o) {
            return new Matrix(
                    a.multiply(o.a).add(b.multiply(o.c)),
                    a.multiply(o.b).add(b.multiply(o.d)),
                    c.multiply(o.a).add(d.multiply(o.c)),
                    c.multiply(o.b).add(d.multiply(o.d)));
        }
    }
}
