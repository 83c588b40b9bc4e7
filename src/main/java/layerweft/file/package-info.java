/**
 * Files in and out: portfolios and programmes, read strictly, edited as trees, and saved.
 *
 * <p>A file that is read goes through three steps. {@code SourceText} reads its bytes within limits and decodes them; {@code TreeParser} turns
 * the text into a tree of located {@code Node}s; the mappings ({@code PortfolioMapping}, {@code ProgrammeMapping} and theirs) describe the
 * formats as {@code Shape}s of {@code Field}s and build the model. Every step gathers faults, so that a user hears of all of them at once.
 *
 * <p>The same mappings lead back: each way to give an object ({@code Variant}) names, beside what it builds, where the model has its fields
 * ({@code Part}), so that {@code PortfolioWriter} and {@code ProgrammeWriter} write every kind that can be read, and {@code FormKinds} tells a
 * form which kinds there are and turns one into another.
 *
 * <p>What a person edits is not the model but the file's own tree, {@code FileTree}: it may be faulty for a while, keeps what it does not
 * know, and keeps numbers as they were written. {@code TreatyCheck} reads a treaty from two trees; {@code SafeFile} saves their text.
 */
package layerweft.file;
