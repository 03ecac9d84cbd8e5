/** Constants of docs/model.md; every equation takes them from here. */
/** Standard gravity, m/s². CGPM 1901; ISO 80000-3. */
export const GRAVITY_M_S2 = 9.80665;
/** Air density, kg/m³. ISO 2533 standard atmosphere at sea level. */
export const AIR_KG_M3 = 1.225;
/** Sea water density, kg/m³. Common design value. */
export const SEA_WATER_KG_M3 = 1025;
/** International nautical mile, m. */
export const METRES_PER_NMI = 1852;
/** One knot in m/s: 1852/3600. */
export const M_S_PER_KNOT = 1852 / 3600;
export const MS_PER_HOUR = 3_600_000;
export const MS_PER_MINUTE = 60_000;
export const DEG_PER_RAD = 180 / Math.PI;
export const RAD_PER_DEG = Math.PI / 180;
