/**
 * Steam that a full-lift nozzle passes, kg/h: W = A·P/190.5 (Napier, in the SI form of API 520 Part I).
 * @param of.areaMm2 curtain or bore area, whichever is less, mm².
 * @param of.pressurePaAbs at the valve, absolute: its set pressure and the rise allowed.
 * @throws RangeError unless both are positive.
 */
export function napierKgPerH(of: { areaMm2: number; pressurePaAbs: number }): number {
  if (!(of.areaMm2 > 0 && of.pressurePaAbs > 0)) throw new RangeError('Area and pressure must be positive');
  return (of.areaMm2 * of.pressurePaAbs) / 1_000 / 190.5;
}

/** Share of the bore's area that each class of lift opens: D/24, D/12, D/4 (Indian Boiler Regulations). */
export const liftShares = { ordinary: 1 / 6, high: 1 / 3, full: 1 } as const;

/** How far above working pressure full fire may take it with the valve lifting, per cent. */
export const accumulationPercent = 10;

/** Pressure that full fire may reach with the valve lifting: working pressure and a tenth (UK hobby code, IBR). */
export const mostWithValveLiftingPa = (workingPa: number): number =>
  (workingPa * (100 + accumulationPercent)) / 100;
