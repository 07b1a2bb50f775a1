import type { WidgetDocument } from '../../widget/document.ts';

/** The falling weight fixes how fast the stone arrives; the path it takes doesn't. */
export const sameDrop: WidgetDocument = {
	version: 2,
	language: 'en',
	constants: '2026.1',
	title: 'Same drop, same blow',
	point: 'The falling weight fixes how fast the stone arrives. The path it takes doesn’t.',
	formulas: [],
	steps: [
		{
			id: 'weight',
			calculator: 'energy.counterweight',
			revision: '1.0.0',
			settings: {
				counterweight_kg: { from: 'fixed', value: 6000 },
				projectile_kg: { from: 'fixed', value: 60 },
				drop_m: { from: 'control', control: 'drop' },
				efficiency: { from: 'fixed', value: 1 }
			}
		},
		{
			id: 'climb',
			calculator: 'energy.drop',
			revision: '1.0.0',
			settings: {
				height_m: { from: 'fixed', value: 12 },
				mass_kg: { from: 'fixed', value: 60 }
			}
		},
		{
			id: 'flat',
			calculator: 'projectile.vacuum',
			revision: '1.0.0',
			settings: {
				v0_ms: { from: 'reading', step: 'weight', output: 'launchSpeed' },
				angle_deg: { from: 'fixed', value: 45 },
				h0_m: { from: 'fixed', value: -12 }
			}
		},
		{
			id: 'lofted',
			calculator: 'projectile.vacuum',
			revision: '1.0.0',
			settings: {
				v0_ms: { from: 'reading', step: 'weight', output: 'launchSpeed' },
				angle_deg: { from: 'fixed', value: 77 },
				h0_m: { from: 'fixed', value: -12 }
			}
		}
	],
	controls: [
		{
			id: 'drop',
			kind: 'slider',
			label: 'How far the weight falls',
			unit: 'm',
			min: 2,
			max: 10,
			step: 0.5,
			initial: 8
		}
	],
	blocks: [
		{
			id: 'opening',
			kind: 'paragraph',
			content: [
				{ kind: 'text', text: 'A weight of ' },
				{ kind: 'claim', claim: 'weight', text: '6000 kilograms' },
				{ kind: 'text', text: ' comes down, and a stone of ' },
				{ kind: 'claim', claim: 'stone', text: '60 kilograms' },
				{
					kind: 'text',
					text: ' goes up. What the weight gives up, the stone takes with it. Of that it pays back '
				},
				{ kind: 'claim', claim: 'climb', text: 'about 7 kilojoules' },
				{ kind: 'text', text: ' to reach the top of a wall, ' },
				{ kind: 'claim', claim: 'wall', text: '12 metres' },
				{ kind: 'text', text: ' up.' }
			]
		},
		{
			id: 'result',
			kind: 'result',
			content: [
				{ kind: 'text', text: 'A weight that falls ' },
				{ kind: 'setting', control: 'drop' },
				{ kind: 'text', text: ' can give the stone ' },
				{ kind: 'live', claim: 'energy' },
				{ kind: 'text', text: '. The stone reaches the wall top at ' },
				{ kind: 'live', claim: 'flat-speed' },
				{ kind: 'text', text: ' on a flat path, and at ' },
				{ kind: 'live', claim: 'lofted-speed' },
				{ kind: 'text', text: ' on a lofted one.' }
			]
		},
		{ id: 'slider', kind: 'control', control: 'drop' },
		{
			id: 'speed',
			kind: 'chart',
			form: 'line',
			title: 'How fast the stone reaches the wall top',
			x: { control: 'drop', label: 'Fall of the weight', scale: 'linear' },
			y: { unit: 'm/s', label: 'speed', scale: 'linear', from: 'data' },
			series: [{ id: 'line', reading: { step: 'flat', output: 'impactSpeed' }, label: '' }],
			bands: [],
			source: 'Conservation of energy; standard gravity 9.80665 m/s²',
			description:
				'A line that climbs and flattens: each further metre of fall adds less speed than the one before.'
		},
		{
			id: 'limits',
			kind: 'limits',
			content: [
				{
					kind: 'text',
					text: 'what a real launcher does. Here all of the drop goes into the stone, with no air and no friction, so this is the most it could do.'
				}
			]
		},
		{
			id: 'caution',
			kind: 'caution',
			content: [
				{ kind: 'text', text: 'Don’t build one from this.', marks: ['strong'] },
				{
					kind: 'text',
					text: ' Launchers injure people. Follow local rules, and work under qualified supervision.'
				}
			]
		}
	],
	claims: [
		{ id: 'weight', form: 'stated', reading: { step: 'weight', setting: 'counterweight_kg' } },
		{ id: 'stone', form: 'stated', reading: { step: 'weight', setting: 'projectile_kg' } },
		{ id: 'climb', form: 'stated', reading: { step: 'climb', output: 'energy' } },
		{ id: 'wall', form: 'stated', reading: { step: 'climb', setting: 'height_m' } },
		{
			id: 'energy',
			form: 'live',
			reading: { step: 'weight', output: 'storedEnergy' },
			unit: 'kJ',
			figures: 3,
			hedge: 'none'
		},
		{
			id: 'flat-speed',
			form: 'live',
			reading: { step: 'flat', output: 'impactSpeed' },
			unit: 'm/s',
			figures: 3,
			hedge: 'about'
		},
		{
			id: 'lofted-speed',
			form: 'live',
			reading: { step: 'lofted', output: 'impactSpeed' },
			unit: 'm/s',
			figures: 3,
			hedge: 'about'
		}
	]
};
