/** What the editor does with things from outside: copy is cleaned, pictures go to their form, files are brought in. */
import type { EditorProps, EditorView } from 'prosemirror-view';

export interface BringTargets {
	readonly readOnly: boolean;
	readonly benchReadOnly: boolean;
	forms: { startPicture(pos: number, files?: readonly File[]): void };
	/** Words with their look, from another program. */
	pasteHtml(html: string): void;
	bringFile(file: File): void;
}

const COPY_FILE = /\.(docx|md|markdown|txt)$/i;

export function isCopyFile({ name }: Pick<File, 'name'>): boolean {
	return COPY_FILE.test(name);
}

/** HTML that an editor of ours put on the clipboard keeps its ties; it needs no cleaning. */
const OWN = /data-pm-slice/;

export function bringingIn(targets: BringTargets): EditorProps {
	const takeFiles = (files: readonly File[], pos: number): boolean => {
		const copy = files.find(isCopyFile);
		const pictures = files.filter(({ type }) => type.startsWith('image/'));
		if (copy) targets.bringFile(copy);
		else if (pictures.length > 0 && !targets.benchReadOnly)
			targets.forms.startPicture(pos, pictures);
		else return false;
		return true;
	};
	return {
		handlePaste(view, event) {
			if (targets.readOnly) return false;
			const html = event.clipboardData?.getData('text/html') ?? '';
			// A word processor puts a picture of the words beside them: words go first.
			if (html === '') return takeFiles(filesOf(event.clipboardData), blockPos(view));
			if (OWN.test(html)) return false;
			targets.pasteHtml(html);
			return true;
		},
		handleDrop(view, event) {
			if (targets.readOnly) return false;
			const at = view.posAtCoords({ left: event.clientX, top: event.clientY })?.pos;
			const pos =
				at === undefined
					? blockPos(view)
					: view.state.doc.resolve(Math.min(at, view.state.doc.content.size - 1)).before(1);
			if (!takeFiles(filesOf(event.dataTransfer), pos)) return false;
			event.preventDefault();
			return true;
		}
	};
}

function filesOf(carrier: DataTransfer | null): File[] {
	return [...(carrier?.files ?? [])];
}

function blockPos({ state: { selection } }: EditorView): number {
	const { $from, from } = selection;
	return $from.depth > 0 ? $from.before(1) : from;
}
