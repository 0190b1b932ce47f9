import { criticalTerms, idealPart, regularTerms } from "./iapws95Coefficients.ts";

/** A dimensionless Helmholtz energy phi(delta, tau) with its first and second derivatives. */
export interface HelmholtzDerivatives {
  phi: number;
  delta: number;
  deltaDelta: number;
  tau: number;
  tauTau: number;
  deltaTau: number;
}

/**
 * Ideal-gas part of the dimensionless Helmholtz energy of water, delta = rho/rho_c, tau = T_c/T.
 * Source  IAPWS R6-95(2018), eq. 5 and Table 4
 * Checked Table 6 of the release: test/eos/water/iapws95.test.ts
 */
export function idealHelmholtz(delta: number, tau: number): HelmholtzDerivatives {
  const { constant, tauFactor, logFactor, vibrations } = idealPart;
  let phi = Math.log(delta) + constant + tauFactor * tau + logFactor * Math.log(tau);
  let first = tauFactor + logFactor / tau;
  let second = -logFactor / (tau * tau);
  for (const { n, gamma } of vibrations) {
    const excited = 1 / Math.expm1(gamma * tau);
    phi += n * Math.log(-Math.expm1(-gamma * tau));
    first += n * gamma * excited;
    second -= n * gamma * gamma * excited * (1 + excited);
  }
  return { phi, delta: 1 / delta, deltaDelta: -1 / (delta * delta), tau: first, tauTau: second, deltaTau: 0 };
}

/**
 * Residual part of the dimensionless Helmholtz energy of water. Infinite or undefined at the critical point itself,
 * where the second derivatives diverge.
 * Source  IAPWS R6-95(2018), eq. 6 and Table 5
 * Checked Table 6 of the release and differences: test/eos/water/iapws95.test.ts
 */
export function residualHelmholtz(delta: number, tau: number): HelmholtzDerivatives {
  const sum = { phi: 0, delta: 0, deltaDelta: 0, tau: 0, tauTau: 0, deltaTau: 0 };
  addRegularTerms(delta, tau, sum);
  addCriticalTerms(delta, tau, sum);
  return sum;
}

/** Every regular term is an exponential exp(L) with L separable, so its derivatives are those of L times the term. */
function addRegularTerms(delta: number, tau: number, sum: HelmholtzDerivatives): void {
  const logDelta = Math.log(delta);
  const logTau = Math.log(tau);
  for (const { n, d, t, c, gauss } of regularTerms) {
    let exponent = d * logDelta + t * logTau;
    let slopeDelta = d / delta;
    let curvatureDelta = -d / (delta * delta);
    let slopeTau = t / tau;
    let curvatureTau = -t / (tau * tau);
    if (c !== undefined) {
      const damping = delta ** c;
      exponent -= damping;
      slopeDelta -= (c * damping) / delta;
      curvatureDelta -= (c * (c - 1) * damping) / (delta * delta);
    }
    if (gauss !== undefined) {
      const fromDelta = delta - gauss.epsilon;
      const fromTau = tau - gauss.gamma;
      exponent -= gauss.alpha * fromDelta * fromDelta + gauss.beta * fromTau * fromTau;
      slopeDelta -= 2 * gauss.alpha * fromDelta;
      curvatureDelta -= 2 * gauss.alpha;
      slopeTau -= 2 * gauss.beta * fromTau;
      curvatureTau -= 2 * gauss.beta;
    }
    const term = n * Math.exp(exponent);
    sum.phi += term;
    sum.delta += term * slopeDelta;
    sum.deltaDelta += term * (slopeDelta * slopeDelta + curvatureDelta);
    sum.tau += term * slopeTau;
    sum.tauTau += term * (slopeTau * slopeTau + curvatureTau);
    sum.deltaTau += term * slopeDelta * slopeTau;
  }
}

/**
 * The two terms that shape the critical region: n * width^b * delta * window, where `width` is the release's Delta and
 * `window` its psi. Powers of q = (delta - 1)^2 are arranged so that none is singular on the critical isochore.
 */
function addCriticalTerms(delta: number, tau: number, sum: HelmholtzDerivatives): void {
  const x = delta - 1;
  const q = x * x;
  const y = tau - 1;
  for (const { n, a, b, B, C, D, A, beta } of criticalTerms) {
    const window = Math.exp(-C * q - D * y * y);
    const windowDelta = -2 * C * x * window;
    const windowDeltaDelta = 2 * C * (2 * C * q - 1) * window;
    const windowTau = -2 * D * y * window;
    const windowTauTau = 2 * D * (2 * D * y * y - 1) * window;
    const windowDeltaTau = 4 * C * D * x * y * window;

    const power = q ** (0.5 / beta - 1);
    const theta = -y + A * power * q;
    const width = theta * theta + B * q ** a;
    const widthDeltaOverX = (A * theta * 2 * power) / beta + 2 * B * a * q ** (a - 1);
    const widthDelta = x * widthDeltaOverX;
    const widthDeltaDelta =
      widthDeltaOverX +
      4 * B * a * (a - 1) * q ** (a - 1) +
      2 * q * ((A * power) / beta) ** 2 +
      ((4 * A * theta) / beta) * (0.5 / beta - 1) * power;

    const w = width ** b;
    const w1 = b * width ** (b - 1);
    const w2 = b * (b - 1) * width ** (b - 2);
    const wDelta = w1 * widthDelta;
    const wDeltaDelta = w1 * widthDeltaDelta + w2 * widthDelta * widthDelta;
    const wTau = -2 * theta * w1;
    const wTauTau = 2 * w1 + 4 * theta * theta * w2;
    const wDeltaTau = ((-2 * A) / beta) * w1 * x * power - 2 * theta * w2 * widthDelta;

    sum.phi += n * w * delta * window;
    sum.delta += n * (w * (window + delta * windowDelta) + wDelta * delta * window);
    sum.deltaDelta +=
      n *
      (w * (2 * windowDelta + delta * windowDeltaDelta) +
        2 * wDelta * (window + delta * windowDelta) +
        wDeltaDelta * delta * window);
    sum.tau += n * delta * (wTau * window + w * windowTau);
    sum.tauTau += n * delta * (wTauTau * window + 2 * wTau * windowTau + w * windowTauTau);
    sum.deltaTau +=
      n *
      (w * (windowTau + delta * windowDeltaTau) +
        delta * wDelta * windowTau +
        wTau * (window + delta * windowDelta) +
        wDeltaTau * delta * window);
  }
}
