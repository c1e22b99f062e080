import type { Alternative, Convention } from '../convention'

const heats: readonly Alternative[] = [
  { label: 'cp 1004, R 287 J kg⁻¹ K⁻¹', constants: { cp: 1004, cv: 717, R: 287 } },
  { label: 'cp 1004.67, R 287.05 J kg⁻¹ K⁻¹', constants: { cp: 1004.67, cv: 717.62, R: 287.05 } },
  { label: 'cp 1005, R 287 J kg⁻¹ K⁻¹', constants: { cp: 1005, cv: 718, R: 287 } },
  { label: 'cp 1005, R 287.05 J kg⁻¹ K⁻¹', constants: { cp: 1005, cv: 717.95, R: 287.05 } },
  { label: 'cp 1005.7, R 287.04 J kg⁻¹ K⁻¹', constants: { cp: 1005.7, cv: 718.66, R: 287.04 } },
  { label: 'cp 1004, R 287.05 J kg⁻¹ K⁻¹', constants: { cp: 1004, cv: 716.95, R: 287.05 } },
]
const gravities: readonly Alternative[] = [
  { label: 'g 9.81 m s⁻²', constants: { g: 9.81 } },
  { label: 'g 9.80665 m s⁻²', constants: { g: 9.80665 } },
]
const exponents: readonly Alternative[] = [
  { label: 'κ 2/7', constants: { kappa: 2 / 7 } },
  { label: 'κ 0.2854', constants: { kappa: 0.2854 } },
  { label: 'κ 0.286', constants: { kappa: 0.286 } },
]

const vaporConstants: readonly Alternative[] = [
  { label: 'Rv 461 J kg⁻¹ K⁻¹', constants: { Rv: 461 } },
  { label: 'Rv 461.52 J kg⁻¹ K⁻¹', constants: { Rv: 461.52 } },
]
const latentHeats: readonly Alternative[] = [
  { label: 'Lv 2.501 MJ kg⁻¹', constants: { latentHeat: 2.501e6 }, variants: { 'latent-heat-of-vaporization': 'constant' } },
  { label: 'Lv 2.5 MJ kg⁻¹', constants: { latentHeat: 2.5e6 }, variants: { 'latent-heat-of-vaporization': 'constant' } },
  { label: 'Lv by Kirchhoff’s relation', variants: { 'latent-heat-of-vaporization': 'kirchhoff' } },
  { label: 'Ls by temperature, Murphy & Koop (2005)', variants: { 'latent-heat-of-sublimation': 'murphy-koop' } },
]
/** Over water and over ice by one source, where it has both. */
const vaporPressures: readonly Alternative[] = [
  { label: 'Magnus form of WMO-No. 8', variants: { 'saturation-vapor-pressure': 'wmo', 'saturation-vapor-pressure-over-ice': 'wmo' } },
  { label: 'Murphy & Koop (2005)', variants: { 'saturation-vapor-pressure': 'murphy-koop', 'saturation-vapor-pressure-over-ice': 'murphy-koop' } },
  { label: 'IAPWS industrial formulation and sublimation curve', variants: { 'saturation-vapor-pressure': 'industrial', 'saturation-vapor-pressure-over-ice': 'sublimation' } },
  { label: 'Goff & Gratch (1946)', variants: { 'saturation-vapor-pressure': 'goff-gratch', 'saturation-vapor-pressure-over-ice': 'goff-gratch' } },
  { label: 'Buck (1981)', variants: { 'saturation-vapor-pressure': 'buck' } },
]
/** In moist air near the ground; Buck (1981) and WMO-No. 8 give 1.004 to 1.0045. */
const enhancement: Alternative = { label: 'enhancement factor 1.004 of moist air', constants: { enhancementFactor: 1.004 } }

/** Formulae of equal standing for one quantity, by the group in which only one holds at once. */
const formulae: readonly Alternative[] = [
  ...(['romps', 'bolton', 'solved'] as const).map(form => ({
    group: 'lifting condensation level', label: `condensation level ${form === 'romps' ? 'by Romps (2017)' : form === 'bolton' ? 'by Bolton (1980)' : 'where w = ws'}`,
    variants: { 'lifting-condensation-level-temperature': form, 'lifting-condensation-level-pressure': form, 'lifting-condensation-level-height': form },
  })),
  { group: 'theta-e', label: 'θe by Bolton’s equation 43', variants: { 'equivalent-potential-temperature': 'bolton-43', 'saturation-equivalent-potential-temperature': 'bolton-43' } },
  { group: 'wet-bulb potential temperature', label: 'θw by Davies-Jones (2008)', variants: { 'wet-bulb-potential-temperature': 'davies-jones' } },
  { group: 'saturated rate', label: 'Γm with the heat capacity of the vapor', variants: { 'saturated-adiabatic-lapse-rate': 'full' } },
  { group: 'wet bulb', label: 'wet bulb with the heat capacity of dry air', variants: { 'wet-bulb-temperature': 'dry-heat', 'wet-bulb-temperature-from-relative-humidity': 'dry-heat', 'mixing-ratio-from-wet-bulb': 'dry-heat' } },
  ...(['ferrel', 'assmann'] as const).map(coefficient => ({
    group: 'psychrometer', label: coefficient === 'ferrel' ? 'psychrometer coefficient of Ferrel' : 'psychrometer coefficient 6.62·10⁻⁴, with ice 5.84·10⁻⁴',
    variants: {
      'vapor-pressure-from-psychrometer': coefficient, 'relative-humidity-from-psychrometer': coefficient,
      ...coefficient === 'assmann' ? { 'vapor-pressure-from-ice-psychrometer': coefficient, 'relative-humidity-from-ice-psychrometer': coefficient } : {},
    },
  })),
  { group: 'mixing', label: 'mixing by the mean of the vapor pressures', variants: { 'isobaric-mixing-vapor-pressure': 'mean-vapor-pressure', 'isobaric-mixing-relative-humidity': 'mean-vapor-pressure' } },
  { group: 'liquid water', label: 'liquid water along the reversible path', variants: { 'adiabatic-liquid-water': 'reversible' } },
]

/** The default convention. It closes: 1004 − 717 = 287. */
export const closed1004: Convention = {
  key: 'closed-1004',
  title: 'cp 1004, cv 717, R 287, g 9.81',
  source: 'common practice; alternatives from AMS Glossary of Meteorology, Bolton (1980), WMO and MetPy documentation',
  constants: {
    cp: 1004, cv: 717, R: 287, g: 9.81, p0: 100_000, zeroCelsius: 273.15, neutralTolerance: 0.0001,
    Rv: 461.5, cpv: 1870, cw: 4190, latentHeat: 2.501e6, latentHeatIce: 2.834e6, earthRadius: 6_356_766, vonKarman: 0.4,
  },
  variants: {},
  beyond: 'compute',
  accepted: [
    ...heats.flatMap(heat => gravities.map(gravity => ({ group: 'dry air', label: `${heat.label}, ${gravity.label}`, constants: { ...heat.constants, ...gravity.constants } }))),
    ...exponents.map(exponent => ({ group: 'dry air', ...exponent })),
    { group: 'dry air', label: 'Γd as usually printed, 9.8 K km⁻¹', variants: { 'dry-adiabatic-lapse-rate': 'as-printed', 'parcel-temperature-by-height': 'printed-rate' } },
    ...vaporConstants.map(one => ({ group: 'water vapor', ...one })),
    ...latentHeats.map(one => ({ group: 'latent heat', ...one })),
    ...vaporPressures.map(one => ({ group: 'vapor pressure', ...one })),
    { group: 'enhancement factor', ...enhancement },
    { group: 'radius of the earth', label: 'mean radius of the earth, 6371 km', constants: { earthRadius: 6_371_000 } },
    ...formulae,
    { group: 'von Kármán constant', label: 'von Kármán constant 0.41', constants: { vonKarman: 0.41 } },
  ],
}
