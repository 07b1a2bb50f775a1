/**
 * Leaves out of the frame's build what calculators, units and constants tell about themselves and no reader's frame
 * shows: sources, checks, history, other names. What is needed to work, to print and to refuse in words stays.
 */
import type { Plugin } from 'vite';

interface Cut {
	files: RegExp;
	/** Only members of the object given to this function; of every object, when absent. */
	givenTo?: string;
	members: Set<string>;
}

const CUTS: Cut[] = [
	{
		files: /src\/lib\/physics\/calculators\//,
		givenTo: 'defineCalculator',
		members: new Set([
			'title',
			'purpose',
			'asks',
			'notFor',
			'equations',
			'assumptions',
			'caution',
			'sources',
			'checks',
			'history',
			'restsOnCosmology'
		])
	},
	{ files: /src\/lib\/physics\/units\/table\.ts$/, members: new Set(['also', 'spoken', 'source']) },
	{
		files: /src\/lib\/physics\/constants\//,
		members: new Set(['source', 'sources', 'note', 'verification', 'adjustment'])
	}
];

interface Node {
	type: string;
	start: number;
	end: number;
	[member: string]: unknown;
}

export function leaveOut(): Plugin {
	return {
		name: 'steelyard:leave-out',
		enforce: 'post',
		transform: {
			filter: { id: /src\/lib\/physics\/.+\.ts$/ },
			handler(code, id) {
				const cut = CUTS.find(({ files }) => files.test(id));
				if (!cut) return null;
				const spans = membersToLeaveOut(this.parse(code) as unknown as Node, cut);
				return spans.reduceRight(
					(kept, [start, end]) => kept.slice(0, start) + kept.slice(end),
					code
				);
			}
		}
	};
}

/** Stretches of code in order, none inside another, each with the comma after it. */
function membersToLeaveOut(node: Node, cut: Cut): [number, number][] {
	if (node.type === 'CallExpression' && cut.givenTo === (node.callee as Node).name && cut.givenTo) {
		const [given] = node.arguments as Node[];
		return given ? spansIn(given, cut) : [];
	}
	const own = cut.givenTo ? [] : spansIn(node, cut);
	const inner = childrenOf(node)
		.filter((child) => !own.some(([start, end]) => child.start >= start && child.end <= end))
		.flatMap((child) => membersToLeaveOut(child, cut));
	return [...own, ...inner].sort(([a], [b]) => a - b);
}

function spansIn(node: Node, { members }: Cut): [number, number][] {
	if (node.type !== 'ObjectExpression') return [];
	const properties = node.properties as Node[];
	return properties.flatMap((property, index): [number, number][] => {
		const next = properties[index + 1];
		return members.has(keyOf(property)) ? [[property.start, next?.start ?? property.end]] : [];
	});
}

function childrenOf(node: Node): Node[] {
	return Object.values(node)
		.flatMap((member) => (Array.isArray(member) ? member : [member]))
		.filter(
			(member): member is Node => typeof member === 'object' && member !== null && 'type' in member
		);
}

function keyOf(property: Node): string {
	const key = property.key as Node | undefined;
	return typeof key?.name === 'string' ? key.name : '';
}
