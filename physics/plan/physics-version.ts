/** Changes with every commit that moves a figure, so that a stored evaluation says which physics it came from. */
export const physicsVersion = '1.1.2';
