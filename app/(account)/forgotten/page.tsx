import type { Metadata } from 'next';
import { ForgottenForm } from './forgotten-form';

export const metadata: Metadata = { title: 'Forgotten password' };

export default function ForgottenPage() {
  return (
    <>
      <h1 className="mb-6 text-3xl">Forgotten password</h1>
      <ForgottenForm />
    </>
  );
}
