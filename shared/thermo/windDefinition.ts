/** What the components of a wind have in common. */
import { cos, sin } from '../numerics/angles'
import type { QuantityDefinition } from './definition'
import { numberOf } from './inputs'
import { directionInput, speedInput, windComponents } from './richardson'
import { slip } from './slips'
import { texNumber, texQuantity } from './tex'
import { perDegree } from './wind'

export function windComponentDefinition(part: 'u' | 'v'): QuantityDefinition {
  const isEastward = part === 'u'
  const towards = isEastward ? 'eastward' : 'northward', own = isEastward ? sin : cos, other = isEastward ? cos : sin
  const functionTex = isEastward ? '\\sin' : '\\cos'
  return {
    key: `${towards}-wind`,
    name: `${towards} component of the wind`,
    symbol: part,
    unit: 'm/s',
    shownUnit: 'm/s',
    kind: 'difference',
    nearZero: 0.1,
    inputs: [speedInput('windSpeed', 'wind speed', 's'), directionInput('windDirection', 'wind direction, where the wind comes from', 'd')],
    variants: [{
      key: 'meteorological', label: 'direction that the wind comes from',
      source: { text: 'AMS Glossary of Meteorology, "wind direction"', status: 'verified' },
      validity: 'any wind', knownError: 'none: the two readings alone decide',
      evaluate: inputs => ({ is: 'value', value: windComponents(numberOf(inputs, 'windSpeed'), numberOf(inputs, 'windDirection'))[part] }),
    }],
    constants: [],
    ask: `The ${towards} component ${part} of the wind, positive where the air moves ${isEastward ? 'to the east' : 'to the north'}; the direction is that from which the wind comes, clockwise from north.`,
    trace(inputs) {
      const s = numberOf(inputs, 'windSpeed'), d = numberOf(inputs, 'windDirection'), value = windComponents(s, d)[part]
      return [{ text: `${isEastward ? 'Eastward' : 'Northward'} component`, formula: `${part} = -s ${functionTex} d`, filled: `${part} = -${texNumber(s)} ${functionTex} ${texNumber(d / perDegree)}^{\\circ}\\,\\mathrm{m\\,s^{-1}} = ${texQuantity(value, 'm/s')}`, value, unit: 'm/s' }]
    },
    slips: [
      slip('sign', 'sign turned round', 'The direction is where the wind comes from: the air moves the other way.', (_i, _c, right) => -right),
      slip('sine-for-cosine', 'sine and cosine swapped', `The angle counts from north: ${part} takes the ${isEastward ? 'sine' : 'cosine'}.`, inputs => -numberOf(inputs, 'windSpeed') * other(numberOf(inputs, 'windDirection'))),
      slip('swapped-and-turned', 'angle counted from east', 'The angle is counted from east, as in mathematics: here it counts clockwise from north.', inputs => numberOf(inputs, 'windSpeed') * other(numberOf(inputs, 'windDirection'))),
      slip('degrees-for-radians', 'degrees taken for radians', 'The degrees went into a function that takes radians.', inputs => -numberOf(inputs, 'windSpeed') * own(numberOf(inputs, 'windDirection') / perDegree)),
    ],
    example: { inputs: { windSpeed: 10, windDirection: 4.71238898038469 }, gives: isEastward ? 10 : 0, within: 1e-9 },
  }
}
