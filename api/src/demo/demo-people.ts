/** The people of the demo. They and their firms are invented; `.example` belongs to nobody. */
export const demoPeople = {
  ines: { name: "Ines Duarte", email: "ines.duarte@okarin.example" },
  tomas: { name: "Tomas Wik", email: "tomas.wik@okarin.example" },
  priya: { name: "Priya Raman", email: "priya.raman@lund-raman.example" },
  aoife: { name: "Aoife Kerr", email: "aoife.kerr@okarin.example" },
} as const;

export type DemoPerson = keyof typeof demoPeople;
