import type { Case } from '../contexts.ts'
import { electrolyteCases } from './electrolytes.ts'
import { handlingCases, nameCases } from './handling.ts'
import { drugCases, ionCases, preservativeCases } from './incompatibility.ts'
import { populationCases } from './populations.ts'
import { osmolalityCases, pHCases, routeCases } from './routes.ts'

export const cases: readonly Case[] = [
  ...ionCases,
  ...drugCases,
  ...preservativeCases,
  ...routeCases,
  ...osmolalityCases,
  ...pHCases,
  ...electrolyteCases,
  ...populationCases,
  ...handlingCases,
  ...nameCases,
]
