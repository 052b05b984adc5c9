import type { CanonicalUnit } from '../units/units'
import type { Basis } from './types'

interface Threshold {
  readonly value: number
  readonly unit: CanonicalUnit
  readonly text: string
  readonly basis: Basis
}

const practice: Basis = { type: 'practice', source: 'Common practice; no published source' }

/** Every number that a verdict turns on and that is not computed, each with where it comes from. The method page prints this table. */
export const thresholds = {
  heaterPassNeeds: {
    value: 2,
    unit: 'ratio',
    text: 'All heaters together may have this many times the heat needed before a second cut-off is asked for',
    basis: practice,
  },
  heaterPassWPerL: {
    value: 1.5,
    unit: 'ratio',
    text: 'or this many watts per litre of water, whichever is more',
    basis: practice,
  },
  heaterChangeNeeds: {
    value: 2.5,
    unit: 'ratio',
    text: 'With a second, independent cut-off they may have this many times the heat needed',
    basis: practice,
  },
  heaterChangeWPerL: {
    value: 2.5,
    unit: 'ratio',
    text: 'or this many watts per litre of water, whichever is more; above that they are too strong',
    basis: practice,
  },
  heaterTargetDuty: {
    value: 0.5,
    unit: 'fraction',
    text: 'Of heaters that fit, those that would run this share of the coldest night come first',
    basis: practice,
  },
  ratedVolumeSlack: {
    value: 0.15,
    unit: 'fraction',
    text: 'Up to this far outside the volumes its maker rates a heater for is a caution, further a change',
    basis: practice,
  },
  rodClearanceMm: {
    value: 10,
    unit: 'mm',
    text: 'Water to leave around a heater: to each wall and between pieces, seen from above',
    basis: practice,
  },
  chillerFromC: {
    value: 27.5,
    unit: 'C',
    text: 'Where the water would pass this without any heater, a fan or a chiller is mentioned',
    basis: practice,
  },
  continuousShare: {
    value: 0.8,
    unit: 'fraction',
    text: 'Share of the rating of strip and circuit that may run for three hours or longer',
    basis: {
      type: 'standard',
      source: 'NEC (NFPA 70) 210.19(A)(1) and 210.20(A) for 120 V; elsewhere common practice',
    },
  },
  tankVolumePass: {
    value: 0.15,
    unit: 'fraction',
    text: 'A tank within this share of the volume it replaces changes nothing by its volume',
    basis: practice,
  },
  tankVolumeChange: {
    value: 0.4,
    unit: 'fraction',
    text: 'Within this share the rest of the setup has to follow; beyond it is another setup',
    basis: practice,
  },
} as const satisfies Record<string, Threshold>

export const practiceBasis = practice
