/** What an action that couldn't be done gives back beside the form: the sentence and its mend. */
export interface ShownFailure {
	code: string;
	message: string;
	help: string;
}

/** The failure of the form with this id in `page.form`; null when another form was sent, or all went well. */
export function failureIn(sent: unknown, formId: string): ShownFailure | null {
	const { form, failure } = (sent ?? {}) as {
		form?: { id?: string };
		failure?: ShownFailure;
	};
	return failure && form?.id === formId ? failure : null;
}
