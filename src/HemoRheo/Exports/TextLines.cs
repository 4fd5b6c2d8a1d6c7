using System.Buffers;
using System.Runtime.InteropServices;
using System.Security.Cryptography;
using System.Text;

namespace HemoRheo;

/// <summary>
/// The lines of a text file, read with bounded memory and strictly: a byte order mark that contradicts the declared encoding, bytes that are
/// no text, control characters and lines of more than 64 KiB end the reading with a finding. The whole file is digested, read or refused.
/// </summary>
internal sealed class TextLines : IDisposable
{
    public const int LongestLine = 64 * 1024;

    private static readonly SearchValues<char> Control = SearchValues.Create([.. Enumerable.Range(0, 32).Where(code => code != '\t').Select(code => (char)code)]);

    private readonly Stream _stream;
    private readonly string _file;
    private readonly string _declared;
    private readonly IncrementalHash _hash = IncrementalHash.CreateHash(HashAlgorithmName.SHA256);
    private readonly byte[] _bytes = new byte[2 * LongestLine];
    private Encoding _encoding;
    private bool _opened;
    private bool _atEnd;
    private int _start;
    private int _end;
    private int _line;

    public TextLines(Stream stream, string file, string declaredEncoding)
    {
        (_stream, _file, _declared) = (stream, file, declaredEncoding);
        _encoding = TextEncodings.Find(declaredEncoding) ?? throw new ArgumentException($"There is no text encoding \"{declaredEncoding}\".", nameof(declaredEncoding));
    }

    /// <summary>Why the reading ended before the file's end; null where it did not.</summary>
    public Finding? Fault { get; private set; }

    /// <summary>The next line; false at the end of the file or of what can be read of it.</summary>
    public bool TryRead(out TextLine line)
    {
        line = default;
        if (Fault is not null || !Opened()) return false;
        var length = LineEnd();
        while (length < 0 && !_atEnd && _end - _start <= LongestLine)
        {
            Fill();
            length = LineEnd();
        }

        var ended = length >= 0;
        if (!ended) length = _end - _start;
        if (!ended && length == 0) return false;
        _line++;
        if (length > LongestLine) return Refuse(ExportFindings.LineTooLong, 1, $"line {_line} longer than {LongestLine} bytes, expected lines that end before that");
        if (Decoded(_bytes.AsSpan(_start, length)) is not { } text) return false;
        _start = Math.Min(_end, _start + length + UnitSize);
        if (text.EndsWith('\r')) text = text[..^1];
        var control = text.AsSpan().IndexOfAny(Control);
        if (control >= 0) return Refuse(ExportFindings.FileBinary, control + 1, $"a control character, U+{(int)text[control]:X4}, where text was expected");
        line = new(text, _line, ended);
        return true;
    }

    /// <summary>SHA-256 of the whole file; reads what is left of it.</summary>
    public string Digest()
    {
        while (!_atEnd)
        {
            (_start, _end) = (0, 0);
            Fill();
        }

        return Convert.ToHexStringLower(_hash.GetCurrentHash());
    }

    public void Dispose()
    {
        _hash.Dispose();
        _stream.Dispose();
    }

    private int UnitSize => _encoding is UnicodeEncoding ? 2 : 1;

    private bool Opened()
    {
        if (_opened) return true;
        _opened = true;
        Fill();
        if (TextMark.Of(_bytes.AsSpan(0, _end)) is { } mark)
        {
            if (!TextMark.Agrees(mark.Encoding, _encoding)) return Refuse(ExportFindings.EncodingMarkDiffers, 1, $"a byte order mark of {mark.Encoding.WebName}, expected none or that of the declared encoding {_declared}");
            (_encoding, _start) = (mark.Encoding, mark.Length);
        }
        else if (_encoding.CodePage == 1200 && !_declared.EndsWith("LE", StringComparison.OrdinalIgnoreCase) && _end > 0)
        {
            return Refuse(ExportFindings.EncodingMarkDiffers, 1, "no byte order mark, expected the one that utf-16 needs; declare utf-16LE or utf-16BE for files without one");
        }

        return true;
    }

    private void Fill()
    {
        _bytes.AsSpan(_start.._end).CopyTo(_bytes);
        (_start, _end) = (0, _end - _start);
        var read = _stream.ReadAtLeast(_bytes.AsSpan(_end), _bytes.Length - _end, throwOnEndOfStream: false);
        _hash.AppendData(_bytes, _end, read);
        _atEnd = _end + read < _bytes.Length;
        _end += read;
    }

    private int LineEnd()
    {
        var span = _bytes.AsSpan(_start, _end - _start);
        if (UnitSize == 1) return span.IndexOf((byte)'\n');
        var index = MemoryMarshal.Cast<byte, char>(span).IndexOf(_encoding.CodePage == 1201 ? '\u0A00' : '\n');
        return index < 0 ? -1 : 2 * index;
    }

    private string? Decoded(ReadOnlySpan<byte> bytes)
    {
        try
        {
            return _encoding.GetString(bytes);
        }
        catch (DecoderFallbackException wrong)
        {
            var good = bytes[..Math.Clamp(wrong.Index, 0, bytes.Length)];
            Refuse(ExportFindings.BytesNotText, good.Length / UnitSize + 1, $"bytes at position {good.Length + 1} of line {_line} that are not {_declared}, expected text in that encoding");
            return null;
        }
    }

    private bool Refuse(FindingKind kind, int column, string message)
    {
        Fault = kind.At(new(_file, Line: Math.Max(1, _line), Column: column), $"Found {message}.");
        return false;
    }
}
