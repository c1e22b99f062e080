import { describe, expect, it } from 'vitest'
import { askParts } from '../../../components/sheet/askParts'
import { askOf } from '../../../server/domain/labs/askOf'
import { defaultConvention } from '#shared/thermo/conventions'
import { quantities } from '#shared/thermo/registry'

describe('the parts of an ask', () => {
  it('are the quantity, what is pinned, and the form of the answer', () => {
    const parts = askParts('The potential temperature θ, referred to 1000 hPa, with κ = R/cp. Pressure p: column Pressure in the lowest row with use = 1 (row 24). Layer: 65 m to 130 m above the ground, both bounds included, the way up; 37 of 463 rows. Constants (cp 1004, cv 717, R 287, g 9.81): R = 287 J kg⁻¹ K⁻¹, cp = 1004 J kg⁻¹ K⁻¹. Answer in K, to 0.1 K or finer.')
    expect(parts.lead).toBe('The potential temperature θ, referred to 1000 hPa, with κ = R/cp.')
    expect(parts.pinned).toEqual([
      { name: 'Pressure p', text: 'column Pressure in the lowest row with use = 1 (row 24)' },
      { name: 'Layer', text: '65 m to 130 m above the ground, both bounds included, the way up; 37 of 463 rows' },
      { name: 'Constants (cp 1004, cv 717, R 287, g 9.81)', text: 'R = 287 J kg⁻¹ K⁻¹, cp = 1004 J kg⁻¹ K⁻¹' },
    ])
    expect(parts.answer).toBe('Answer in K, to 0.1 K or finer.')
  })

  it('keep every word, for each quantity', () => {
    const words = (text: string) => text.replace(/[.:]/g, '').split(/\s+/).filter(word => word !== '')
    for (const definition of quantities) {
      const ask = askOf({ key: 's', kind: 'number', title: 'S', text: '', pointsMilli: 1000, quantity: definition.key, variant: null, inputs: {}, unit: definition.shownUnit, digits: 3, granted: {}, slipMilli: 0, digitsMilli: 0, near: null, block: null, divisions: {}, accuracy: null }, definition, defaultConvention, {}, null)
      const { lead, pinned, answer } = askParts(ask)
      expect(words([lead, ...pinned.map(pin => `${pin.name} ${pin.text}`), answer].join(' '))).toEqual(words(ask))
      expect(answer).toMatch(/^Answer /)
    }
  })

  it('hold a text that is no ask as it is', () => {
    expect(askParts('A step without a quantity')).toEqual({ lead: 'A step without a quantity', pinned: [], answer: '' })
  })
})
