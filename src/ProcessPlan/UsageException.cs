namespace ProcessPlan;

/// <summary>The words that the program was called with are not understood.</summary>
/// <param name="sentence">What was read, and what was expected.</param>
internal sealed class UsageException(string sentence) : Exception(sentence);
