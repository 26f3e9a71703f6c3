/** Molar gas constant, J mol⁻¹ K⁻¹. Source: [CODATA2018]. */
export const MOLAR_GAS_CONSTANT_J_PER_MOL_K = 8.314462618;
/** Molar mass of dry air, kg mol⁻¹. Source: [MetPy] constants. */
export const DRY_AIR_MOLAR_MASS_KG_PER_MOL = 0.02896546;
/** Molar mass of water, kg mol⁻¹. Source: [MetPy] constants. */
export const WATER_MOLAR_MASS_KG_PER_MOL = 0.018015268;
/** Standard acceleration of gravity, m s⁻². Source: [CGPM1901], [WMO8]. */
export const GRAVITY_M_PER_S2 = 9.80665;
/** Nought degrees Celsius in kelvin. Source: [WMO8]; not the triple point 273.16 K. */
export const ZERO_CELSIUS_K = 273.15;
/** Reference pressure of potential temperature, hPa. Source: [AMSGlossary] potential temperature. */
export const REFERENCE_PRESSURE_HPA = 1000;

/** Gas constant of dry air, J kg⁻¹ K⁻¹ (287.047): derived. */
export const DRY_AIR_GAS_CONSTANT_J_PER_KG_K = MOLAR_GAS_CONSTANT_J_PER_MOL_K / DRY_AIR_MOLAR_MASS_KG_PER_MOL;
/** Gas constant of water vapour, J kg⁻¹ K⁻¹ (461.523): derived. */
export const VAPOUR_GAS_CONSTANT_J_PER_KG_K = MOLAR_GAS_CONSTANT_J_PER_MOL_K / WATER_MOLAR_MASS_KG_PER_MOL;
/** Specific heat of dry air at constant pressure, J kg⁻¹ K⁻¹ (1004.67): 7/2 of the gas constant, derived. */
export const DRY_AIR_SPECIFIC_HEAT_J_PER_KG_K = (7 / 2) * DRY_AIR_GAS_CONSTANT_J_PER_KG_K;
/** κ = R/cp of dry air, without unit (2/7): derived. */
export const KAPPA = DRY_AIR_GAS_CONSTANT_J_PER_KG_K / DRY_AIR_SPECIFIC_HEAT_J_PER_KG_K;
/** ε, ratio of the molar masses of water and dry air, without unit (0.62196): derived. */
export const EPSILON = WATER_MOLAR_MASS_KG_PER_MOL / DRY_AIR_MOLAR_MASS_KG_PER_MOL;
/** Dry-adiabatic lapse rate Γd = g/cp, K/km (9.761): derived; [AMSGlossary] "approximately 9.8 °C/km". */
export const DRY_ADIABATIC_LAPSE_RATE_K_PER_KM = (1000 * GRAVITY_M_PER_S2) / DRY_AIR_SPECIFIC_HEAT_J_PER_KG_K;
/** Autoconvective lapse rate g/R, K/km (34.16): density no longer falls with height. [AMSGlossary] 3.4e-4 °C/cm. */
export const AUTOCONVECTIVE_LAPSE_RATE_K_PER_KM = (1000 * GRAVITY_M_PER_S2) / DRY_AIR_GAS_CONSTANT_J_PER_KG_K;
