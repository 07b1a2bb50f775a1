/** Shown, always, beside readings about things that could hurt someone who goes and does them. */
export const PROJECTILE_CAUTION =
	'Don’t try this with anything that shoots. Projectiles injure people. Follow local rules, and leave such work to qualified people.';

export const ROCKET_CAUTION =
	'Don’t build or fuel a rocket from this. Propellants burn and explode. Follow local rules, and work under qualified supervision.';

export const RADIATION_CAUTION =
	'Nothing here says that a source is safe to handle or to stand near. Follow local rules, and ask a qualified radiation protection adviser.';

export const SUN_CAUTION =
	'Never look at the Sun without a filter made for it, least of all through lenses or mirrors: it blinds at once. Follow the advice of qualified observers.';
