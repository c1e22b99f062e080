import { judgeStep } from '#shared/marking/judge'
import { log } from '#shared/numerics/elementary'
import { quantities } from '#shared/thermo/registry'
import { reading } from '../fixtures/marking/ask'
import { seededQuestion } from '../fixtures/marking/questions'
import { seconds } from './ascents'
import type { Ratio } from './ratio'

const few = 25, many = 400
/** Twelve steps of a lab: fits, heat, moist air, wind, and a parcel. */
const steps = ['lapse-rate-end-points', 'lapse-rate-least-squares', 'lapse-rate-standard-error', 'potential-temperature', 'parcel-temperature-by-height', 'isobaric-heat-of-mass', 'hypsometric-thickness', 'brunt-vaisala-frequency-squared', 'saturation-vapor-pressure', 'sensor-lag-error', 'mean-wind-direction', 'k-index']

/** CPU seconds of judging a class, each student on inputs of their own and with a wrong value, so that every slip is tried. */
function judgeClass(students: number): number {
  const definitions = steps.map((key) => {
    const definition = quantities.find(one => one.key === key)
    if (!definition) throw new Error(`There is no quantity ${key}.`)
    return definition
  })
  const asked = Array.from({ length: students }, (_, student) => definitions.map(definition => ({ question: seededQuestion(definition, 1 + student).question, answer: reading(definition.key, '0.123456') }))).flat()
  const start = process.cpuUsage()
  for (const { question, answer } of asked) judgeStep(question, answer)
  return seconds(start)
}

/** The exponent with which judging grows with the class: 1 is linear. The time of 400 × 12 goes to stderr. */
export const growthWithStudents: Ratio = {
  id: 'P11', part: 'growth-with-students', bar: 1.05, says: `log of CPU time / log of students, from ${few} to ${many}, 12 steps each with every slip`,
  command: 'npm run bench -- --only P11/growth-with-students',
  plant: 'own',
  async measure({ isShort, isPlanted = false }) {
    judgeClass(few)
    const times: number[] = []
    const rounds = Array.from({ length: isShort ? 3 : 7 }, () => {
      const small = Array.from({ length: many / few }, () => judgeClass(few)).reduce((sum, one) => sum + one, 0) / (many / few)
      const large = judgeClass(many) + (isPlanted ? judgeClass(many) : 0)
      times.push(large)
      return { numerator: log(large / small), denominator: log(many / few) }
    })
    console.error(`${many} students × ${steps.length} steps judged with slips: ${Math.min(...times).toFixed(2)} s CPU, ${(Math.min(...times) / many / steps.length * 1e6).toFixed(0)} µs a step`)
    return rounds
  },
}
