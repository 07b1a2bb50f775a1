/** A piece on its way, for service tests: three people and the demo's own document, brought as far as a test needs. */
import { firstLight } from '../../src/lib/server/demo/first-light.ts';
import { signClaim } from '../../src/lib/server/services/claims.ts';
import { createPiece } from '../../src/lib/server/services/draft-start.ts';
import { getPiece, saveDraft } from '../../src/lib/server/services/pieces.ts';
import { passProof, pullProof } from '../../src/lib/server/services/proofs.ts';
import type { Inline, WidgetDocument } from '../../src/lib/widget/document.ts';
import type { ClaimState, PieceView } from '../../src/lib/workflow/piece.ts';
import type { Office } from './office.ts';

export const SLUG = 'first-light-on-the-dial';

export class Desk {
	constructor(
		readonly office: Office,
		readonly writer: string,
		readonly scientist: string,
		readonly editor: string
	) {}

	static async open(office: Office): Promise<Desk> {
		return new Desk(
			office,
			await office.add('Tamsin Orrelby', ['writer']),
			await office.add('Mateus Quevarro', ['scientist']),
			await office.add('Perpetua Lindqvane', ['editor'])
		);
	}

	/** The piece as the writer sees it. */
	async piece(): Promise<PieceView> {
		return getPiece(await this.office.as(this.writer), SLUG);
	}

	async states(): Promise<Record<string, ClaimState>> {
		const { proof } = await this.piece();
		return Object.fromEntries((proof?.claims ?? []).map(({ id, state }) => [id, state]));
	}

	async create(): Promise<void> {
		await createPiece(await this.office.as(this.writer), { title: firstLight.title, slug: SLUG });
	}

	/** Saves a document as the newest draft. */
	async save(document: WidgetDocument, by = this.writer): Promise<void> {
		const { version } = await this.piece();
		await saveDraft(await this.office.as(by), SLUG, { baseVersion: version, document });
	}

	/** Saves the draft as `change` leaves it. */
	async edit(change: (document: WidgetDocument) => void, by = this.writer): Promise<void> {
		const document = structuredClone((await this.piece()).document);
		change(document);
		await this.save(document, by);
	}

	/** Pulls a proof; its id. */
	async pull(): Promise<string> {
		return (await pullProof(await this.office.as(this.writer), SLUG)).proofId;
	}

	/** Signs every claim that stands unsigned or lapsed. */
	async signAll(by = this.scientist): Promise<void> {
		const ctx = await this.office.as(by);
		const { proof } = await this.piece();
		for (const { id, state } of proof?.claims ?? []) {
			if (state === 'unsigned' || state === 'lapsed')
				await signClaim(ctx, SLUG, { proofId: proof!.id, claim: id });
		}
	}

	async pass(proofId: string, by = this.editor): Promise<void> {
		await passProof(await this.office.as(by), SLUG, { proofId });
	}

	/** Created, written and pulled; the proof's id. */
	async toProof(document: WidgetDocument = firstLight): Promise<string> {
		await this.create();
		await this.save(document);
		return this.pull();
	}

	/** As far as checked. */
	async toChecked(): Promise<string> {
		const proofId = await this.toProof();
		await this.signAll();
		return proofId;
	}
}

/** The inlines of one text block. */
export function contentOf(document: WidgetDocument, blockId: string): Inline[] {
	const block = document.blocks.find(({ id }) => id === blockId);
	if (!block || !('content' in block))
		throw new Error(`The document has no text block ${blockId}.`);
	return block.content;
}

/** Replaces words in the plain text of one block; fails when they aren't there. */
export function reword(document: WidgetDocument, blockId: string, from: string, to: string): void {
	for (const inline of contentOf(document, blockId)) {
		if (inline.kind === 'text' && inline.text.includes(from)) {
			inline.text = inline.text.replace(from, to);
			return;
		}
	}
	throw new Error(`“${from}” isn’t in ${blockId}.`);
}
