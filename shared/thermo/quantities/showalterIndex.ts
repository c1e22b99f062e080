import { exp, log } from '../../numerics/elementary'
import { indexDefinition, ofLevels } from '../indexDefinition'
import { parcelContext } from '../parcelContext'
import { fineSlip, signSlip } from '../slips'
import { showalter } from '../stabilityIndices'
import { texFactor, texQuantity } from '../tex'

/** Showalter index: see `showalter`. */
export const showalterIndexDefinition = indexDefinition({
  key: 'showalter-index', name: 'Showalter index', symbol: 'SI', kind: 'difference', shownUnit: 'K', nearZero: 1,
  source: 'Showalter (1953), Bull. Amer. Meteor. Soc. 34, 250–252; AMS Glossary of Meteorology, "Showalter index"', isAscent: true,
  ask: 'The Showalter index, T of the surroundings at 500 hPa less that of a parcel lifted from 850 hPa, dry to its condensation level and along the pseudoadiabat above, no virtual correction; negative where the parcel is warmer.',
  of: (levels, inputs, constants, formulae) => showalter(levels, inputs, constants, formulae).index,
  steps(levels, value, inputs, constants, formulae) {
    const { parcel } = showalter(levels, inputs, constants, formulae)
    return [
      { text: 'Parcel of 850 hPa at 500 hPa', formula: 'T_p', filled: `T_p = ${texQuantity(parcel, 'K', 6)}`, value: parcel, unit: 'K' },
      { text: 'Surroundings less parcel', formula: 'SI = T_{500} - T_p', filled: `SI = ${texQuantity(levels.t500, 'K', 6)} - ${texQuantity(parcel, 'K', 6)} = ${texFactor(value)}\\,\\mathrm{K}`, value, unit: 'K' },
    ]
  },
  slips: [
    signSlip('The index is the surroundings less the parcel: negative where the parcel is warmer.'),
    fineSlip('dry-all-the-way', 'lifted dry all the way', 'This lifts the parcel dry all the way: above its condensation level it follows the pseudoadiabat.', ofLevels((levels, inputs, constants, formulae) => levels.t500 - levels.t850 * exp(parcelContext(inputs, constants, formulae).air.kappa * log(50_000 / 85_000)))),
  ],
  gives: -1.280154, within: 1e-06,
})
