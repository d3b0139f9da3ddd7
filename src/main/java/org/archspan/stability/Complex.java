package org.archspan.stability;

/** A complex number, for what is not in an inner loop. */
record Complex(double re, double im) {
  Complex plus(Complex other) {
    return new Complex(re + other.re, im + other.im);
  }

  Complex minus(Complex other) {
    return new Complex(re - other.re, im - other.im);
  }

  Complex times(double factor) {
    return new Complex(re * factor, im * factor);
  }

  Complex times(Complex other) {
    return new Complex(re * other.re - im * other.im, re * other.im + im * other.re);
  }

  Complex over(Complex other) {
    double square = other.re * other.re + other.im * other.im;
    return new Complex((re * other.re + im * other.im) / square, (im * other.re - re * other.im) / square);
  }

  double magnitude() {
    return Math.hypot(re, im);
  }

  /** The root with a real part that is not negative. */
  Complex sqrt() {
    double magnitude = magnitude();
    if (magnitude == 0.0) {
      return this;
    }
    double real = Math.sqrt(0.5 * (magnitude + Math.abs(re)));
    double other = 0.5 * Math.abs(im) / real;
    return re >= 0.0 ? new Complex(real, Math.copySign(other, im)) : new Complex(other, Math.copySign(real, im));
  }
}
