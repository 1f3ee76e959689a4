/** The package ships no types; only what the tests call is declared. */
declare module "@lhncbc/ucum-lhc" {
  export class UcumLhcUtils {
    static getInstance(): UcumLhcUtils;
    convertUnitTo(from: string, value: number, to: string): { toVal: number | null };
    validateUnitString(unit: string): { status: "valid" | "invalid" | "error" };
  }
}
