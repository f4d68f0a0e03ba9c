import type { Curve } from './curve';

const HEADER_NUMBERS = 7;
const END_OF_NOTES = ']'.charCodeAt(0);

/** Bytes of a curve (little endian): seven numbers, both coefficient arrays, then the notes as JSON. Exact. */
export function encodeCurve(curve: Curve): Uint8Array {
  const notes = new TextEncoder().encode(JSON.stringify(curve.notes));
  const numbers = [
    curve.lnRadiusMin,
    curve.lnRadiusStep,
    curve.relativeErrorBound,
    curve.shareOutsideValidRange,
    curve.capped ? 1 : 0,
    curve.coefficients.length,
    curve.absorption.length,
    ...curve.coefficients,
    ...curve.absorption,
  ];
  const bytes = new Uint8Array(8 * numbers.length + notes.length);
  const view = new DataView(bytes.buffer);
  numbers.forEach((number, index) => view.setFloat64(8 * index, number, true));
  bytes.set(notes, 8 * numbers.length);
  return bytes;
}

/** Curve from the bytes of `encodeCurve`; throws a RangeError when they are cut short. */
export function decodeCurve(bytes: Uint8Array): Curve {
  const view = new DataView(bytes.buffer, bytes.byteOffset, bytes.byteLength);
  const number = (index: number) => view.getFloat64(8 * index, true);
  const coefficientCount = number(5);
  const absorptionCount = number(6);
  const absorptionStart = HEADER_NUMBERS + coefficientCount;
  const notesStart = absorptionStart + absorptionCount;
  if (bytes.length <= 8 * notesStart || bytes[bytes.length - 1] !== END_OF_NOTES)
    throw new RangeError('The bytes of an efficiency curve are cut short.');
  const notes: unknown = JSON.parse(new TextDecoder().decode(bytes.subarray(8 * notesStart)));
  return {
    lnRadiusMin: number(0),
    lnRadiusStep: number(1),
    relativeErrorBound: number(2),
    shareOutsideValidRange: number(3),
    capped: number(4) === 1,
    coefficients: Float64Array.from({ length: coefficientCount }, (_, index) => number(HEADER_NUMBERS + index)),
    absorption: Float64Array.from({ length: absorptionCount }, (_, index) => number(absorptionStart + index)),
    notes: Array.isArray(notes) ? notes.map(String) : [],
  };
}
