import { NothingHere } from '@/src/ui/nothing-here';

/** Keeps the navigation around what is not there. */
export default function ShellNotFound() {
  return <NothingHere />;
}
