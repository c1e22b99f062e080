import { windComponentDefinition } from '../windDefinition'

/**
 * Eastward component of the wind.
 *
 *   u = −s sin d     d where the wind comes from, clockwise from north
 *
 * Source: AMS Glossary of Meteorology, "wind direction". See `windComponents`.
 *
 * @example 10 m/s from 270°: u +10, v 0
 */
export const eastwardWindDefinition = windComponentDefinition('u')
