/** A brake as stored: the searched columns beside its whole document (machine/1). */
export interface MachineRow {
  readonly id: string;
  readonly name: string;
  readonly bed_length_mm: number;
  readonly max_force_kn: number;
  readonly daylight_mm: number;
  readonly punch_tang: string;
  readonly die_tang: string;
  readonly document: unknown;
}
