import { formulaeOf, taughtVariant } from '#shared/marking/alternatives'
import type { Convention } from '#shared/marking/types'
import type { ComputeReply } from '#shared/schemas/handbook'
import type { InputDefinition, Inputs, QuantityDefinition } from '#shared/thermo/definition'
import { evaluateQuantity } from '#shared/thermo/evaluate'
import { formatUnit } from '#shared/units/formatQuantity'
import { inUnit } from './inWords'

const mostSteps = 60
const fewestSteps = 12
/** Values that a curve may be computed from in all: a long series takes a coarser curve, so that its page costs no more than others. */
const mostWork = 3000

/** The value while one input runs about where it stands, the others held; a break where there is no value. Null where nothing can run. */
export function curveOf(definition: QuantityDefinition, convention: Convention, pinned: string | undefined, inputs: Inputs, along: string, unit: string): ComputeReply['curve'] {
  const input = definition.inputs.find(one => one.name === along && one.shape === 'number')
  const here = inputs[along]
  if (!input || typeof here !== 'number' || definition.kind === 'class') return null
  const [low, high] = spanAbout(here, input)
  const steps = stepsFor(inputs)
  const variant = taughtVariant(definition, convention, pinned)
  const pointAt = (at: number) => ({ x: inUnit(at, input.shownUnit, input.kind !== 'temperature'), y: valueAt({ ...inputs, [along]: at }) })
  const points = Array.from({ length: steps + 1 }, (_, step) => pointAt(low + (high - low) * step / steps))
  return {
    along, points, here: pointAt(here), at: inUnit(here, input.shownUnit, input.kind !== 'temperature'),
    xLabel: axisLabel(input.label, input.shownUnit), yLabel: axisLabel(definition.name, unit),
  }

  function valueAt(moved: Inputs): number | null {
    try {
      const outcome = evaluateQuantity(definition, moved, convention.constants, variant, formulaeOf(convention))
      return outcome.is === 'value' ? inUnit(outcome.value, unit, definition.kind !== 'temperature') : null
    }
    catch {
      // beyond what can be computed: the curve has a break there
      return null
    }
  }
}

function stepsFor(inputs: Inputs): number {
  const values = Object.values(inputs).reduce<number>((sum, value) => sum + (typeof value === 'number' || value === undefined ? 1 : value.length), 0)
  return Math.max(fewestSteps, Math.min(mostSteps, Math.floor(mostWork / values)))
}

function axisLabel(label: string, unit: string): string {
  const shown = formatUnit(unit)
  return shown === '' ? label : `${label}, ${shown}`
}

/** 30 K to both sides of a temperature; half to one and a half of anything else; within the physical range. */
function spanAbout(here: number, { kind, range }: InputDefinition): [number, number] {
  const reach = kind === 'temperature' ? 30 : Math.max(Math.abs(here) / 2, (range[1] - range[0]) / 1000)
  return [Math.max(range[0], here - reach), Math.min(range[1], here + reach)]
}
