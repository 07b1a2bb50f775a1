/** Every address the app links to, as functions, so that a moved page moves its links. */
export const routes = {
	home: () => '/' as const,
	signIn: () => '/sign-in' as const,
	signInLink: () => '/sign-in/link' as const,
	signOut: () => '/sign-out' as const,
	desk: () => '/desk' as const,
	manuscript: (slug: string) => `/pieces/${slug}/manuscript` as const,
	/** Earlier drafts of a piece: the list, one opened, or two laid side by side. */
	earlierDrafts: (slug: string) => `/pieces/${slug}/history` as const,
	check: (slug: string) => `/pieces/${slug}/check` as const,
	galley: (slug: string) => `/pieces/${slug}/galley` as const,
	/** The document of one strip; it takes what it shows from the galley around it. */
	galleyStrip: (slug: string) => `/pieces/${slug}/galley/strip` as const,
	/** The manuscript at one block. */
	manuscriptAt: (slug: string, block: string) =>
		`/pieces/${slug}/manuscript#block-${block}` as const,
	release: (slug: string) => `/pieces/${slug}/release` as const,
	calculators: () => '/calculators' as const,
	calculator: (id: string) => `/calculators/${id}` as const,
	constantsEdition: (edition: string) => `/calculators/constants/${edition}` as const,
	newCalculator: () => '/calculators/house/new' as const,
	reviseCalculator: (id: string) => `/calculators/house/${id}/revise` as const,
	pictures: () => '/pictures' as const,
	picture: (id: string) => `/pictures/${id}` as const,
	themes: () => '/themes' as const,
	theme: (id: string) => `/themes/${id}` as const,
	/** The public page of a piece: who made and checked it, its text, the snippet. */
	publicPage: (slug: string) => `/w/${slug}` as const,
	/** The frame for partner pages: newest release, or one numbered release for good. */
	frame: (slug: string, release: number | 'latest' = 'latest') => `/w/${slug}/${release}` as const,
	api: {
		importWord: () => '/api/import/word' as const,
		copyAsMarkdown: (slug: string) => `/api/pieces/${slug}/copy.md` as const,
		draft: (slug: string) => `/api/pieces/${slug}/draft` as const,
		slip: (slug: string) => `/api/pieces/${slug}/slip` as const,
		/** Names a draft, so that it can be found again. */
		draftName: (slug: string) => `/api/pieces/${slug}/draft/name` as const,
		pictures: () => '/api/pictures' as const,
		picture: (id: string) => `/api/pictures/${id}` as const,
		replacePicture: (id: string) => `/api/pictures/${id}/replace` as const,
		/** A stored width, for those who are signed in; `name` is its hash and ending. */
		pictureFile: (name: string) => `/api/pictures/files/${name}` as const,
		tryCalculator: () => '/api/calculators/try' as const,
		formula: () => '/api/formula' as const,
		calculators: () => '/api/v1/calculators' as const,
		calculator: (id: string) => `/api/v1/calculators/${id}` as const
	}
};
