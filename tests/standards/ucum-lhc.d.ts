declare module '@lhncbc/ucum-lhc' {
  interface UcumLhcUtils {
    validateUnitString(code: string): { readonly status: 'valid' | 'invalid' | 'error' }
    convertUnitTo(
      from: string,
      value: number,
      to: string,
    ): { readonly status: 'succeeded' | 'failed' | 'error'; readonly toVal: number | null; readonly msg?: unknown }
  }
  export const UcumLhcUtils: { getInstance(): UcumLhcUtils }
}
