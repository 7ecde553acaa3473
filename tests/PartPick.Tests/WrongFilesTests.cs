using System.Text;

namespace PartPick.Tests;

/// <summary>
/// Whatever is wrong with a file: one line on standard error that names it, says what is wrong and what fits, and status 2.
/// </summary>
public class WrongFilesTests
{
    private static readonly (string Command, string Option, string Good)[] Commands =
    [
        ("check", "", CheckCommandTests.Circuit),
        ("rank", "", """{ "output": "1 kHz", "supply": ["4.5 V", "5.5 V"], "temperature": [-10, 50], "circuits": ["counter"] }"""),
        ("caps", "--crystal", """{ "frequency": "4 MHz", "load": "18 pF", "motional": "12 fF", "resistance": 100 }"""),
    ];

    private static readonly (string Kind, string Expected, Func<string, byte[]> Make)[] Kinds =
    [
        ("an empty file", "is not valid JSON", _ => []),
        ("blanks alone", "is not valid JSON", _ => Bytes(" \n\t ")),
        ("a piece of one", "line ", good => Bytes(good[..^2])),
        ("two in a row", "is not valid JSON", good => Bytes(good + good)),
        ("a list", "holds a list", good => Bytes($"[{good}]")),
        ("a number", "holds the number", _ => Bytes("5")),
        ("a text", "holds the text", _ => Bytes("\"5\"")),
        ("nothing", "holds nothing", _ => Bytes("null")),
        ("bytes", "is not valid JSON", _ => [.. Enumerable.Range(0, 2048).Select(k => (byte)(k * 37))]),
        ("zeros", "is not valid JSON", _ => new byte[100]),
        ("a deep nest", "is not valid JSON", _ => Bytes(new string('[', 100_000))),
        ("a deep nest in a key", "is not valid JSON", good => With(good, "\"a\": " + new string('[', 70) + new string(']', 70))),
        ("an unknown key", "colour: is no key", good => With(good, "\"colour\": 1")),
        ("a key with a line feed", "is no key", good => With(good, "\"a\\nb\\u001b[31m\": 1")),
        ("a key of a megabyte", "is no key", good => With(good, $"\"{new string('k', 1_000_000)}\": 1")),
        ("a key without a name", "is no key", good => With(good, "\"\": 1")),
        ("half a character", "holds half a character", good => With(good, "\"\\ud800\": 1")),
        ("half a character in a text", "holds half a character", good => With(good, "\"name\": \"\\udc00\"")),
        ("the same key twice", "is given twice", good => Bytes(good.Insert(1, FirstKey(good)))),
    ];

    public static TheoryData<string, string> Cases
    {
        get
        {
            var cases = new TheoryData<string, string>();
            foreach ((string command, _, _) in Commands)
            {
                foreach ((string kind, _, _) in Kinds)
                {
                    cases.Add(command, kind);
                }
            }

            return cases;
        }
    }

    [Theory]
    [MemberData(nameof(Cases))]
    public void Wrong_file_is_one_line_that_says_where_what_and_what_fits(string command, string kind)
    {
        (_, string option, string good) = Commands.Single(known => known.Command == command);
        (_, string expected, Func<string, byte[]> make) = Kinds.Single(known => known.Kind == kind);
        string path = Run.File("", "wrong.json");
        File.WriteAllBytes(path, make(good));

        string line = Run.Of([command, .. option.Length > 0 ? new[] { option } : [], path]).WrongLine();

        Assert.StartsWith("wrong.json", line, StringComparison.Ordinal);
        Assert.Contains(expected, line, StringComparison.Ordinal);
        Assert.Contains("; fits ", line, StringComparison.Ordinal);
        Assert.InRange(line.Length, 20, 600);
        Assert.DoesNotContain(line, char.IsControl);
    }

    [Theory]
    [InlineData("/no/such/file.json", "is not there")]
    [InlineData("/", "is a directory")]
    [InlineData("", "cannot be read")]
    public void Path_that_is_no_file_is_one_line(string path, string expected) => Assert.All(Commands, known =>
    {
        string line = Run.Of([known.Command, .. known.Option.Length > 0 ? new[] { known.Option } : [], path]).WrongLine();

        Assert.Contains(expected, line, StringComparison.Ordinal);
        Assert.Contains("; fits ", line, StringComparison.Ordinal);
    });

    [Fact]
    public void File_in_UTF_16_or_with_a_mark_is_read_all_the_same()
    {
        string path = Run.File("");
        File.WriteAllText(path, CheckCommandTests.Circuit, Encoding.Unicode);
        Assert.Equal(0, Run.Of("check", path).Status);
        File.WriteAllText(path, CheckCommandTests.Circuit, new UTF8Encoding(encoderShouldEmitUTF8Identifier: true));
        Assert.Equal(0, Run.Of("check", path).Status);
    }

    private static byte[] Bytes(string text) => Encoding.UTF8.GetBytes(text);

    private static byte[] With(string good, string field) => Bytes(good.Insert(1, field + ", "));

    private static string FirstKey(string good)
    {
        int end = good.IndexOf(',', StringComparison.Ordinal);
        return good[1..(end + 1)];
    }
}
