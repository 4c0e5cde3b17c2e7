import { airConductivity, airDensity, airKinematicViscosity, airViscosity } from '@/lib/physics/air';
import {
  waterConductivity,
  waterDensity,
  waterSaturationPressure,
  waterSpecificHeat,
  waterViscosity,
} from '@/lib/physics/water';
import { toKelvin } from '@/lib/units/constants';
import type { ReferenceRow } from './reference-row';

const SEA_LEVEL_C = 15;
const ROOM_C = 25;

/** Water and air against values that their own standards print. */
export const fluidRows: readonly ReferenceRow[] = [
  {
    id: 'air-sea-level',
    title: 'Standard atmosphere at sea level, 15 °C: density, viscosities, conductivity',
    source: 'U.S. Standard Atmosphere 1976, table I to III at 0 m (density as in ISO 2533)',
    provenance: 'from memory',
    tier: 'B',
    expected: { density: 1.225, viscosity: 1.7894e-5, kinematic: 1.4607e-5, conductivity: 0.025326 },
    tolerance: { density: 1e-3, viscosity: 1e-3, kinematic: 1e-3, conductivity: 1e-3 },
    relative: true,
    compute: () => ({
      density: airDensity(SEA_LEVEL_C),
      viscosity: airViscosity(toKelvin(SEA_LEVEL_C)),
      kinematic: airKinematicViscosity(SEA_LEVEL_C),
      conductivity: airConductivity(toKelvin(SEA_LEVEL_C)),
    }),
  },
  {
    id: 'water-25',
    title: 'Water at 25 °C and 0.1 MPa: density, specific heat, viscosity, conductivity',
    source: 'IAPWS releases on water at 0.1 MPa and on its transport properties; printed in handbooks alike',
    provenance: 'from memory',
    tier: 'B',
    expected: { density: 997.047, specificHeat: 4181.3, viscosity: 8.9e-4, conductivity: 0.6065 },
    tolerance: { density: 1e-4, specificHeat: 5e-4, viscosity: 2e-3, conductivity: 2e-3 },
    relative: true,
    compute: () => ({
      density: waterDensity(ROOM_C),
      specificHeat: waterSpecificHeat(ROOM_C),
      viscosity: waterViscosity(ROOM_C),
      conductivity: waterConductivity(ROOM_C),
    }),
  },
  {
    id: 'water-saturation-300K',
    title: 'Saturation pressure of water at 300 K [Pa]',
    source: 'IAPWS-IF97, verification value of region 4: 0.353658941e-2 MPa',
    provenance: 'from memory',
    tier: 'B',
    expected: { pressurePa: 3536.58941 },
    tolerance: 1e-4,
    relative: true,
    compute: () => ({ pressurePa: waterSaturationPressure(26.85) }),
  },
];
