namespace HemoRheo;

/// <summary>Columns that look like direct identifiers of people: names, birth dates, addresses, record numbers.</summary>
internal static class DirectIdentifier
{
    private static readonly string[] Words =
        ["name", "names", "surname", "firstname", "lastname", "forename", "birth", "birthdate", "birthday", "dob", "born", "email", "mail", "phone", "telephone", "mobile", "address", "street", "postcode", "zip", "mrn", "ssn", "passport", "insurance", "record", "recordnumber", "initials"];

    /// <summary>Whether a header has a word of a direct identifier.</summary>
    public static bool IsLike(string header)
    {
        var letters = string.Concat(header.ToLowerInvariant().Select(sign => char.IsLetter(sign) ? sign : ' '));
        return letters.Split(' ', StringSplitOptions.RemoveEmptyEntries).Any(word => Words.Contains(word));
    }
}
