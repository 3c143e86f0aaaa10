export { COLEBROOK_ROUGHNESS, SOLVABLE_ROUGHNESS, colebrookRoot, frictionColebrook1939 } from './colebrook';
export { darcyWeisbach, reynoldsNumber } from './darcy-weisbach';
export { COMPRESSION, FLEXIBLE_DIAMETER, flexibleCompressionFactor } from './flexible';
export { INSTALLED_LENGTH, STRETCH, flexibleStretchFactor, type FlexibleStretch } from './flexible-stretch';
export { TRANSITION } from './blend';
export { frictionFactor, frictionFactorSlope, regime, type FrictionSpec, type Regime } from './friction-factor';
export { DEFAULT_MATERIAL, findMaterial, materials, type Material } from './materials';
export { frictionAltshulTsal1989, frictionChurchill1977, frictionSwameeJain1976 } from './rivals';
