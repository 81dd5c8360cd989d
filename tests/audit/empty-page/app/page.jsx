import { connection } from 'next/server';

/** Made per request, as every page of the product is. */
export default async function EmptyPage() {
  await connection();
  // Without anything to paint there is nothing to measure.
  return <main>One line.</main>;
}
