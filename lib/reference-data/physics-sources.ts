/** The works that the physics leans on, for the page that names them. */
export { sources } from '@/physics/sources';
