import type { GarmentDefinition, RemedyDefinition } from '../contract'
import { forwardShoulder } from './forward-shoulder'
import { fullBust } from './full-bust'
import { largeArm } from './large-arm'
import type { Change, Remedy } from './remedy'
import { roundBack } from './round-back'
import { slopingShoulder } from './sloping-shoulder'
import { swayBack } from './sway-back'

const all: readonly Remedy[] = [fullBust, roundBack, swayBack, forwardShoulder, slopingShoulder, largeArm]

/** The remedy of that id, or undefined. */
export function remedyById(id: unknown): Remedy | undefined {
  return all.find((remedy) => remedy.id === id)
}

function has(garment: GarmentDefinition, change: Change): boolean {
  if ('rule' in change) return garment.rules.some(({ id }) => id === change.rule)
  if ('style' in change) return garment.design.some(({ id }) => id === change.style)
  return true
}

/** What one millimetre of a remedy does to a garment; empty where it is not offered. */
export function changesFor(remedy: Remedy, garment: GarmentDefinition): readonly Change[] {
  return remedy.ways
    .filter(
      ({ needs = [], changes }) =>
        needs.every((rule) => garment.rules.some(({ id }) => id === rule)) &&
        changes.every((change) => has(garment, change)),
    )
    .flatMap(({ changes }) => changes)
}

/** Every remedy, with the garments it is offered for. */
export function remediesOf(garments: readonly GarmentDefinition[]): readonly RemedyDefinition[] {
  return all.map((remedy) => ({
    ...definitionOf(remedy),
    garments: garments.filter((garment) => changesFor(remedy, garment).length > 0).map(({ id }) => id),
  }))
}

function definitionOf({
  ways: _ways,
  where: _where,
  ...definition
}: Remedy): Omit<RemedyDefinition, 'garments'> {
  return definition
}
