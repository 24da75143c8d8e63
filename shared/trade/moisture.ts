/**
 * Equilibrium moisture content of wood: USDA Wood Handbook FPL-GTR-190 Eq. 4–5 (formula read), coefficients in °C as an
 * open implementation of FPL-RN-0268 gives them (read twice removed). The handbook's Table 4–2 is this formula rounded.
 */

/** Where Table 4–2 holds, as read: 30 to 210 °F in °C, and % relative humidity. */
export const moistureDomain = { celsius: [-10 / 9, 890 / 9], humidity: [5, 95] } as const;

/** What the historic data are good for, percent points of moisture content (FPL-GTR-229, abstract read). */
export const moistureUncertainty = 1;

interface Coefficients {
  w: number;
  k: number;
  k1: number;
  k2: number;
}

function sorbed({ w, k, k1, k2 }: Coefficients, h: number): number {
  const kh = k * h;
  const one = k1 * kh;
  const two = k1 * k2 * kh * kh;
  return (1800 / w) * (kh / (1 - kh) + (one + 2 * two) / (1 + one + two));
}

/** Moisture content in percent that wood comes to, at °C and % relative humidity. */
export const equilibriumMoisture = (celsius: number, humidity: number): number =>
  sorbed(
    {
      w: 349 + 1.29 * celsius + 0.0135 * celsius ** 2,
      k: 0.805 + 0.000736 * celsius - 0.00000273 * celsius ** 2,
      k1: 6.27 - 0.00938 * celsius - 0.000303 * celsius ** 2,
      k2: 1.91 + 0.0407 * celsius - 0.000293 * celsius ** 2,
    },
    humidity / 100,
  );

/** The same by the handbook's coefficients for °F (a transcription of the same note); a check on the other. */
export const equilibriumMoistureFahrenheit = (fahrenheit: number, humidity: number): number =>
  sorbed(
    {
      w: 330 + 0.452 * fahrenheit + 0.00415 * fahrenheit ** 2,
      k: 0.791 + 0.000463 * fahrenheit - 0.000000844 * fahrenheit ** 2,
      k1: 6.34 + 0.000775 * fahrenheit - 0.0000935 * fahrenheit ** 2,
      k2: 1.09 + 0.0284 * fahrenheit - 0.0000904 * fahrenheit ** 2,
    },
    humidity / 100,
  );

/**
 * The relative humidity, %, at which wood comes to a moisture content, at °C; null when none inside 5 to 95 % does.
 * The formula rises with humidity, so halving finds it.
 */
export function humidityFor(celsius: number, moisture: number): number | null {
  let [low, high] = moistureDomain.humidity as readonly [number, number];
  if (
    !(moisture >= equilibriumMoisture(celsius, low)) ||
    !(moisture <= equilibriumMoisture(celsius, high))
  )
    return null;
  for (let i = 0; i < 60; i++) {
    const middle = (low + high) / 2;
    if (equilibriumMoisture(celsius, middle) < moisture) low = middle;
    else high = middle;
  }
  return (low + high) / 2;
}
