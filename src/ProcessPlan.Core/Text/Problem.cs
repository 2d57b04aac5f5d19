namespace ProcessPlan.Core.Text;

/// <summary>One thing in the user's text that cannot be taken as it stands.</summary>
/// <param name="Message">What was read, in one sentence to the person at the machine.</param>
/// <param name="At">Place of the first character meant, counted from 0.</param>
/// <param name="Length">Number of characters meant; 0 only where the text is empty.</param>
/// <param name="Expected">What would have been understood there, the nearest valid value first.</param>
public sealed record Problem(string Message, int At, int Length, string Expected);
