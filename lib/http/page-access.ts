import 'server-only';

import { notFound, redirect } from 'next/navigation';
import { getActor, getGardenActor, type Actor, type GardenActor } from '../auth/session';
import { AppError } from './app-error';

const UUID = /^[0-9a-f]{8}-[0-9a-f]{4}-[0-9a-f]{4}-[0-9a-f]{4}-[0-9a-f]{12}$/i;

/** Who looks at a page; a stranger is sent to sign in. */
export async function pageActor(): Promise<Actor> {
  return (await getActor()) ?? redirect('/sign-in');
}

/** Who looks at a garden's page; somebody with no part in it finds nothing there. */
export async function pageGardenActor(gardenId: string): Promise<GardenActor> {
  await pageActor();
  if (!UUID.test(gardenId)) notFound();
  return (await getGardenActor(gardenId)) ?? notFound();
}

/** A service's "not found" as the page's. */
export async function found<T>(answer: Promise<T>): Promise<T> {
  try {
    return await answer;
  } catch (error) {
    if (error instanceof AppError && error.status === 404) notFound();
    throw error;
  }
}

export const isUuid = (text: string): boolean => UUID.test(text);
