import { formulaParts, indexedParts, type TextPart } from './lowered';

export const IndexedText = ({ text }: { text: string }) => <Parts parts={indexedParts(text)} />;

export const ChemicalFormula = ({ formula }: { formula: string }) => <Parts parts={formulaParts(formula)} />;

const Parts = ({ parts }: { parts: readonly TextPart[] }) =>
  parts.map(({ text, isLowered }, place) => (isLowered ? <sub key={place}>{text}</sub> : text));
