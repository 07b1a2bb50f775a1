/** Published bytes, by content-addressed key, in a store that speaks the S3 protocol. */
import {
	CreateBucketCommand,
	DeleteObjectCommand,
	GetObjectCommand,
	HeadObjectCommand,
	ListObjectsV2Command,
	PutObjectCommand,
	S3Client,
	S3ServiceException
} from '@aws-sdk/client-s3';
import { SteelyardError } from '../../errors.ts';

export interface ObjectStore {
	/** Keys are content-addressed, so putting one twice changes nothing. Makes the bucket when there is none yet. */
	put(key: string, bytes: Uint8Array, contentType: string): Promise<void>;
	/** Null when the store has no such key. */
	get(key: string): Promise<Uint8Array | null>;
	/** Whether the store has the key. */
	head(key: string): Promise<boolean>;
	/** Removing what isn't there changes nothing. */
	remove(key: string): Promise<void>;
	/** Every key that begins so, and when it was last put. */
	list(prefix: string): Promise<StoredKey[]>;
	close(): void;
}

export interface StoredKey {
	key: string;
	putAt: Date;
}

export interface StoreSettings {
	endpoint: string;
	bucket: string;
	region: string;
	accessKeyId: string;
	secretAccessKey: string;
	/** How long one request may take; 8 s when not given. */
	requestTimeoutMs?: number;
}

/** Every method throws the SteelyardError `store-away` when the store doesn't answer, or refuses. */
export function openObjectStore(settings: StoreSettings): ObjectStore {
	const client = new S3Client({
		endpoint: settings.endpoint,
		region: settings.region,
		credentials: { accessKeyId: settings.accessKeyId, secretAccessKey: settings.secretAccessKey },
		forcePathStyle: true, // a store on an address without wildcard host names
		maxAttempts: 2,
		requestHandler: {
			connectionTimeout: 2_000,
			requestTimeout: settings.requestTimeoutMs ?? 8_000,
			throwOnRequestTimeout: true
		},
		// Older stores don't know the newer checksum trailers; our keys are the checksum.
		requestChecksumCalculation: 'WHEN_REQUIRED',
		responseChecksumValidation: 'WHEN_REQUIRED'
	});
	const at = (key: string) => ({ Bucket: settings.bucket, Key: key });

	return {
		async put(key, bytes, contentType) {
			const send = () =>
				client.send(new PutObjectCommand({ ...at(key), Body: bytes, ContentType: contentType }));
			await reached(async () => {
				try {
					await send();
				} catch (error) {
					if (!isNamed(error, 'NoSuchBucket')) throw error;
					await client.send(new CreateBucketCommand({ Bucket: settings.bucket }));
					await send();
				}
			});
		},
		async get(key) {
			return reached(() =>
				unlessMissing(async () => {
					const { Body } = await client.send(new GetObjectCommand(at(key)));
					return Body ? await Body.transformToByteArray() : new Uint8Array();
				})
			);
		},
		async head(key) {
			const found = await reached(() =>
				unlessMissing(() => client.send(new HeadObjectCommand(at(key))))
			);
			return found !== null;
		},
		async remove(key) {
			await reached(() => unlessMissing(() => client.send(new DeleteObjectCommand(at(key)))));
		},
		async list(prefix) {
			const found: StoredKey[] = [];
			let next: string | undefined;
			do {
				const page = await reached(() =>
					unlessMissing(() =>
						client.send(
							new ListObjectsV2Command({
								Bucket: settings.bucket,
								Prefix: prefix,
								ContinuationToken: next
							})
						)
					)
				);
				for (const { Key: key, LastModified: putAt } of page?.Contents ?? [])
					if (key !== undefined && putAt) found.push({ key, putAt });
				next = page?.NextContinuationToken;
			} while (next !== undefined);
			return found;
		},
		close: () => client.destroy()
	};
}

async function unlessMissing<T>(ask: () => Promise<T>): Promise<T | null> {
	try {
		return await ask();
	} catch (error) {
		// A store without its bucket has no key either; the first `put` makes the bucket.
		if (isNamed(error, 'NoSuchKey', 'NotFound', 'NoSuchBucket')) return null;
		throw error;
	}
}

async function reached<T>(ask: () => Promise<T>): Promise<T> {
	try {
		return await ask();
	} catch (error) {
		throw new SteelyardError('store-away', {
			cause: error instanceof Error ? error.message : String(error)
		});
	}
}

function isNamed(error: unknown, ...names: string[]): boolean {
	return error instanceof S3ServiceException && names.includes(error.name);
}
