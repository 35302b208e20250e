import conventions from '../../data/parameters/conventions.json'
import binary from '../../data/parameters/pitzer/binary.json'
import mixing from '../../data/parameters/pitzer/mixing.json'
import neutral from '../../data/parameters/pitzer/neutral.json'
import { deviceFiles } from './devices.ts'
import { bufferFiles } from './buffers.ts'
import { cautionFiles } from './cautions.ts'
import { curveFiles } from './curves.ts'
import { equilibriaFiles, speciesFiles } from './equilibria.ts'
import { estimateFiles } from './estimates.ts'
import { findingFiles } from './findings.ts'
import { atomicWeightFiles } from './formula-mass.ts'
import { formFiles } from './forms.ts'
import { ingredientFiles } from './ingredients.ts'
import { routeFiles } from './routes.ts'
import { solidFiles } from './solids.ts'
import { sourceFiles } from './sources.ts'
import { stepFiles } from './steps.ts'
import { stockFiles } from './stocks.ts'
import { usualStrengthFiles } from './usual-strengths.ts'
import { vehicleFiles } from './vehicles.ts'

const folders: Readonly<Record<string, Readonly<Record<string, unknown>>>> = {
  buffers: { ...vehicleFiles, ...bufferFiles },
  cautions: { ...cautionFiles, ...usualStrengthFiles },
  devices: deviceFiles,
  equilibria: { ...equilibriaFiles, ...solidFiles },
  findings: findingFiles,
  forms: formFiles,
  ingredients: ingredientFiles,
  parameters: { conventions, ...estimateFiles },
  'parameters/curves': curveFiles,
  'parameters/pitzer': { binary, mixing, neutral },
  routes: routeFiles,
  sources: sourceFiles,
  species: { ...speciesFiles, ...atomicWeightFiles },
  steps: stepFiles,
  stocks: stockFiles,
}

/** What every data file says, by the path of the file below data/, without its ending. */
export function libraryContent(): Readonly<Record<string, unknown>> {
  return Object.fromEntries(
    Object.entries(folders).flatMap(([folder, files]) =>
      Object.entries(files).map(([file, content]) => [`${folder}/${file}`, content]),
    ),
  )
}
