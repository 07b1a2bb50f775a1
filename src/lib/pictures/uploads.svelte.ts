/** Files on their way to the picture desk: one after another, each with how far it is and what went wrong with it. */
import { routes } from '../routes.ts';
import type { ShownFailure } from '../ui/failure.ts';
import { failureOf, refusalIn } from './ask.ts';
import { LARGEST_BYTES, type PictureView } from './view.ts';

export type UploadState = 'waiting' | 'sending' | 'drawing' | 'kept' | 'failed' | 'stopped';

export class Upload {
	state = $state<UploadState>('waiting');
	/** How much of the file is sent, from 0 to 1. */
	share = $state(0);
	failure = $state.raw<ShownFailure | null>(null);

	constructor(
		readonly id: number,
		readonly file: File
	) {}

	get isOpen(): boolean {
		return this.state === 'waiting' || this.state === 'sending' || this.state === 'drawing';
	}
}

const CUT_OFF: ShownFailure = {
	code: 'away',
	message: 'The connection ended before all of it was here.',
	help: 'Nothing of it is kept. Send it again.'
};

export class Uploads {
	all = $state<Upload[]>([]);
	#requests = new Map<Upload, XMLHttpRequest>();
	#next = 1;
	#busy = false;

	/** `onkept` gets each picture as soon as the house has it. */
	constructor(private readonly onkept: (picture: PictureView) => void) {}

	get isBusy(): boolean {
		return this.all.some((upload) => upload.isOpen);
	}

	add(files: Iterable<File>): void {
		for (const file of files) {
			const upload = new Upload(this.#next++, file);
			this.all.push(upload);
			// No need to send it all to hear this.
			if (file.size > LARGEST_BYTES) fail(upload, failureOf('picture-too-heavy'));
		}
		void this.#work();
	}

	stop(upload: Upload): void {
		if (!upload.isOpen) return;
		upload.state = 'stopped';
		this.#requests.get(upload)?.abort();
	}

	/** Once more, from the start. */
	again(upload: Upload): void {
		upload.state = 'waiting';
		upload.failure = null;
		upload.share = 0;
		void this.#work();
	}

	clear(upload: Upload): void {
		this.all = this.all.filter(({ id }) => id !== upload.id);
	}

	/** Stops all that is under way. */
	close(): void {
		for (const upload of this.all) this.stop(upload);
	}

	async #work(): Promise<void> {
		if (this.#busy) return;
		this.#busy = true;
		for (let next = this.#waiting(); next; next = this.#waiting()) await this.#send(next);
		this.#busy = false;
	}

	#waiting(): Upload | undefined {
		return this.all.find(({ state }) => state === 'waiting');
	}

	#send(upload: Upload): Promise<void> {
		return new Promise((resolve) => {
			const request = new XMLHttpRequest();
			this.#requests.set(upload, request);
			request.open('POST', `${routes.api.pictures()}?name=${encodeURIComponent(upload.file.name)}`);
			request.setRequestHeader('content-type', upload.file.type || 'application/octet-stream');
			request.upload.onprogress = ({ loaded, total }) => {
				upload.share = total > 0 ? loaded / total : 0;
			};
			request.upload.onload = () => {
				if (upload.state === 'sending') upload.state = 'drawing';
			};
			request.onload = () => {
				if (request.status === 201) {
					upload.state = 'kept';
					this.onkept((JSON.parse(request.responseText) as { picture: PictureView }).picture);
				} else {
					const answer = refusalIn(request.responseText);
					if (!answer.ok) fail(upload, answer.failure);
				}
			};
			request.onerror = () => fail(upload, CUT_OFF);
			request.onloadend = () => {
				this.#requests.delete(upload);
				resolve();
			};
			upload.state = 'sending';
			request.send(upload.file);
		});
	}
}

function fail(upload: Upload, failure: ShownFailure): void {
	upload.state = 'failed';
	upload.failure = failure;
}
