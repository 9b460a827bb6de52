/**
 * The quantities that inputs and results are made of, each defined once: the unit a bare number is read in, the range
 * that makes sense, whether zero is a value, and the band outside which a bare number is doubted.
 */
export interface Quantity {
  /** The trade's word, as it stands in messages: "density". */
  name: string;
  /** The unit a bare number is read and returned in; "" for a pure number. */
  unit: string;
  /** An input of this kind that works, as a message suggests it. */
  example: string;
  /** Lowest and highest value, closed; a lowest of Number.MIN_VALUE means "above zero". */
  least: number;
  most: number;
  /** Where false, a 0 in a cell counts as blank, since the host sends an empty cell as 0. */
  zeroIsValue: boolean;
  /** Bare numbers are plausible from `low` to `high`; beyond, the hint says what may have been meant. */
  band?: Band;
  /** Temperatures in K and energies in eV stand for each other through k_B. */
  thermal?: true;
  /** An RF amplitude, zero to peak: peak-to-peak and rms text is converted. */
  amplitude?: true;
  /** A frequency that is also given in rad/s when that unit is asked for by name. */
  angular?: true;
}

export interface Band {
  low: number;
  high: number;
  below?: string;
  above?: string;
}

type Facts = Partial<Omit<Quantity, "name" | "unit" | "example">>;

const positive: Facts = { least: Number.MIN_VALUE, zeroIsValue: false };
const notNegative: Facts = { least: 0, zeroIsValue: true };

function quantity(name: string, unit: string, example: string, facts: Facts = {}): Quantity {
  return { name, unit, example, least: -Number.MAX_VALUE, most: Number.MAX_VALUE, zeroIsValue: true, ...facts };
}

const density = quantity("density", "m^-3", "1e16 m^-3", {
  ...positive,
  band: { low: 3e12, high: 1e23, below: "cm⁻³ meant?" },
});

/** Electrons and ions alike; in eV, as the trade writes it. */
const temperature = quantity("temperature", "eV", "3 eV", {
  ...positive,
  thermal: true,
  band: { low: 5e-3, high: 1000, below: "is it in eV?", above: "K meant?" },
});

const gasTemperature = quantity("temperature", "K", "300 K", {
  ...positive,
  thermal: true,
  band: { low: 50, high: 1e4, below: "°C or eV meant?" },
});

const wallTemperature = quantity("temperature", "K", "2500 K", {
  ...positive,
  thermal: true,
  band: { low: 77, high: 4500, below: "°C or eV meant?" },
});

const pressure = quantity("pressure", "Pa", "0.7 Pa", {
  ...positive,
  band: { low: 1e-4, high: 20, above: "mTorr meant?" },
});

const magneticField = quantity("magnetic field", "T", "0.02 T", {
  ...positive,
  band: { low: 1e-5, high: 20, above: "gauss meant?" },
});

const length = quantity("length", "m", "1 mm", {
  ...positive,
  band: { low: 1e-9, high: 20, above: "mm meant?" },
});

const voltage = quantity("voltage", "V", "-50 V", { band: { low: -1e6, high: 1e6 } });

export const quantities = {
  density,
  temperature,
  gasTemperature,
  wallTemperature,
  pressure,
  magneticField,
  length,
  voltage,
  /** A distance that may be zero, such as the depth in a profile. */
  distance: { ...length, name: "distance", ...notNegative } as Quantity,
  /** Of a sheath: a fraction of a millimetre to decimetres, so that one typed in mm is noticed. */
  width: { ...length, name: "width", band: { low: 1e-6, high: 1, above: "mm meant?" } } as Quantity,
  /** A potential drop given without its sign. */
  drop: { ...voltage, name: "voltage", example: "300 V" } as Quantity,
  energy: quantity("energy", "eV", "15 eV", { ...notNegative, thermal: true, band: { low: 0, high: 1e6 } }),
  workFunction: quantity("work function", "eV", "4.5 eV", {
    ...positive,
    band: { low: 1, high: 8, above: "J meant?" },
  }),
  speed: quantity("speed", "m/s", "2700 m/s", { ...positive, band: { low: 10, high: 1e8, below: "km/s meant?" } }),
  frequency: quantity("frequency", "Hz", "13.56 MHz", {
    ...positive,
    band: { low: 1e3, high: 1e12, below: "MHz meant?" },
  }),
  /** A frequency as a result: in cycles per second, and in radians per second on request. */
  anyFrequency: quantity("frequency", "Hz", "13.56 MHz", { ...positive, angular: true }),
  amplitude: quantity("amplitude", "V", "300 Vpp", { ...notNegative, amplitude: true, band: { low: 0, high: 1e5 } }),
  time: quantity("time", "s", "1 us", { ...notNegative, band: { low: 0, high: 10, above: "µs meant?" } }),
  area: quantity("area", "m^2", "1e-4 m^2", { ...positive, band: { low: 1e-10, high: 100, above: "mm² meant?" } }),
  crossSection: quantity("cross-section", "m^2", "1e-18 m^2", {
    ...positive,
    band: { low: 1e-22, high: 1e-16, above: "cm² meant?" },
  }),
  angle: quantity("angle", "deg", "5 deg", { least: Number.MIN_VALUE, most: 90, zeroIsValue: false }),
  currentDensity: quantity("current density", "A/m^2", "25 A/m^2", { band: { low: -1e9, high: 1e9 } }),
  current: quantity("current", "A", "1 mA", { band: { low: -1e4, high: 1e4 } }),
  flux: quantity("flux", "m^-2 s^-1", "1e20 m^-2 s^-1", {
    ...positive,
    band: { low: 1e12, high: 1e27, below: "cm⁻² s⁻¹ meant?" },
  }),
  massDensity: quantity("mass density", "kg/m^3", "2330 kg/m^3", {
    ...positive,
    band: { low: 50, high: 30000, below: "g/cm³ meant?" },
  }),
  erosionRate: quantity("erosion rate", "m/s", "10 nm/min", notNegative),
  field: quantity("electric field", "V/m", "1e5 V/m"),
  heatFlux: quantity("heat flux", "W/m^2", "1e4 W/m^2"),
  capacitance: quantity("capacitance per area", "F/m^2", "5 pF/cm^2"),
  resistance: quantity("resistance times area", "ohm m^2", "0.1 ohm m^2"),
  richardson: quantity("Richardson constant", "A m^-2 K^-2", "60.2 A cm^-2 K^-2", {
    ...positive,
    band: { low: 1e4, high: 1e8, below: "A cm⁻² K⁻² meant?" },
  }),
  probability: quantity("probability function", "eV^-1.5 m^-3", "1e15 eV^-1.5 m^-3"),
  mass: quantity("mass", "kg", "40 u", positive),
  /** A pure number with no range of its own. */
  number: quantity("number", "", "0.5"),
  ratio: quantity("ratio", "", "0.61", positive),
  notNegative: quantity("number", "", "0.1", notNegative),
} as const;
