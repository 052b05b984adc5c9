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
  standOverhangMm: {
    value: 150,
    unit: 'mm',
    text: 'A stand larger than the tank by more than this is a caution',
    basis: practice,
  },
  standKgPerRatedL: {
    value: 1.4,
    unit: 'kg/L',
    text: 'Filled weight per litre of the tanks that a stand without a load rating is made for',
    basis: practice,
  },
  parSoftLow: {
    value: 50,
    unit: 'umol/m2/s',
    text: 'Lower end of the light that soft and large-polyp corals are kept under',
    basis: practice,
  },
  parSoftHigh: { value: 150, unit: 'umol/m2/s', text: 'Upper end of it', basis: practice },
  parSpsLow: {
    value: 200,
    unit: 'umol/m2/s',
    text: 'Lower end of the light that small-polyp corals are kept under',
    basis: practice,
  },
  parSpsHigh: { value: 350, unit: 'umol/m2/s', text: 'Upper end of it', basis: practice },
  lightCoverPass: {
    value: 0.7,
    unit: 'fraction',
    text: 'Share of the target plane in the band that counts as lit',
    basis: practice,
  },
  lightCoverChange: {
    value: 0.5,
    unit: 'fraction',
    text: 'Share from which a light passes with dim ends',
    basis: practice,
  },
  lightBrightMost: {
    value: 0.5,
    unit: 'fraction',
    text: 'Share of the target plane that a light which cannot be dimmed may put above the band',
    basis: practice,
  },
  lightMostUnits: {
    value: 4,
    unit: 'count',
    text: 'Most lights of one model that are proposed together',
    basis: practice,
  },
  lightSpill: {
    value: 0.35,
    unit: 'fraction',
    text: 'Share of the photons that may miss the water before it is mentioned',
    basis: practice,
  },
  lightOverTankMm: {
    value: 50,
    unit: 'mm',
    text: 'A light may be this much longer than the tank',
    basis: practice,
  },
  lightHungRatio: {
    value: 1.25,
    unit: 'ratio',
    text: 'A light that hangs may be this many times as long as the tank',
    basis: practice,
  },
  blueShare: {
    value: 0.35,
    unit: 'fraction',
    text: 'Share of photons from 400 to 500 nm below which a light is warmer than corals prefer',
    basis: practice,
  },
  pumpBoreMm: { value: 1.5, unit: 'mm', text: 'Difference of bores that a hose takes up', basis: practice },
  pumpClearanceMm: { value: 5, unit: 'mm', text: 'Water to leave at each side of a pump', basis: practice },
  pumpCoverMm: {
    value: 30,
    unit: 'mm',
    text: 'Water to leave above a pump whose maker states no least depth',
    basis: practice,
  },
  pumpSlowest: {
    value: 0.4,
    unit: 'fraction',
    text: 'Speed to which a pump with speed control is throttled',
    basis: practice,
  },
  wavemakerMost: {
    value: 3,
    unit: 'count',
    text: 'Most wavemakers of one model that are proposed together',
    basis: practice,
  },
  sandBlowsMm: {
    value: 0.25,
    unit: 'mm',
    text: 'Sand with grains finer than this blows about in strong flow',
    basis: practice,
  },
  sandBlowsTurnover: { value: 20, unit: '/h', text: 'Strong flow, by the hour', basis: practice },
  rockBaseShare: { value: 0.5, unit: 'fraction', text: 'Share of the rock that should be base rock', basis: practice },
  grainLowMm: { value: 0.25, unit: 'mm', text: 'Finer sand blows about in strong flow', basis: practice },
  grainHighMm: { value: 2, unit: 'mm', text: 'Coarser sand traps waste', basis: practice },
  salinityLowPpt: { value: 30, unit: 'ppt', text: 'Lower end of what a salinity meter has to span', basis: practice },
  salinityHighPpt: { value: 40, unit: 'ppt', text: 'Upper end of it', basis: practice },
  salinityStepPpt: { value: 1, unit: 'ppt', text: 'Coarsest step of a salinity meter', basis: practice },
  magnetThinShare: {
    value: 0.6,
    unit: 'fraction',
    text: 'Share of a magnet’s thinnest wall down to which it is only stronger than needed',
    basis: practice,
  },
  scraperReachMm: { value: 50, unit: 'mm', text: 'Handle left above the tank', basis: practice },
  siphonDryMm: { value: 50, unit: 'mm', text: 'How far a hand goes below the rim with a siphon', basis: practice },
  netShare: { value: 0.5, unit: 'fraction', text: 'Share of the display’s width that a net may open', basis: practice },
  sumpRimMm: {
    value: 100,
    unit: 'mm',
    text: 'From a sump’s water to the rim that water is lifted over',
    basis: practice,
  },
  reservoirDays: { value: 3, unit: 'count', text: 'Days of evaporation that a reservoir should hold', basis: practice },
} as const satisfies Record<string, Threshold>

export const practiceBasis = practice
