import type { FieldProblem } from '@lampwright/contracts';
import type { HarnessFault, HarnessFaultCode } from '@lampwright/harness';
import faultCatalogue from '../../i18n/en/faults';
import type { ApiError } from '../../lib/api-error';

const isCode = (code: string): code is HarnessFaultCode => code in faultCatalogue;

function toFault({ path, code, params = {} }: FieldProblem): HarnessFault[] {
  return isCode(code) ? [{ ...params, code, path }] : [];
}

/** The faults that the server found, which may know rules that this version of the web does not. */
export function serverFaults(error: ApiError): HarnessFault[] {
  return error.fields.flatMap(toFault);
}
